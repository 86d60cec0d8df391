'use client';
import type { Demand } from '@groundward/engine/path/result';
import { createContext, useContext, type ReactNode } from 'react';
import type { Facts } from '@/lib/demands';
import { originOf } from '@/lib/origin';

const FactsContext = createContext<Facts | undefined>(undefined);

/** Lets every number below it say where it comes from. */
export function FactsOf({ facts, children }: { readonly facts: Facts | undefined; readonly children: ReactNode }) {
  return <FactsContext.Provider value={facts}>{children}</FactsContext.Provider>;
}

/** @returns the sentences that say where a demand comes from */
export function useOrigin(): (demand: Demand) => string {
  const facts = useContext(FactsContext);
  return (demand) => (facts === undefined ? demand.member : originOf(demand, facts));
}

/** Whether the numbers here are a revision's, whose working can be shown. */
export function useHasWorking(): boolean {
  return useContext(FactsContext) !== undefined;
}
