'use client';
import type { Demand } from '@groundward/engine/path/result';
import { quantity } from '@/lib/format';
import { useOrigin } from './facts';

/** A demand as a number with its unit; pointing at it, or reaching it by keys, says where it comes from. */
export function Figure({
  demand,
  significant = 3,
}: {
  readonly demand: Demand | undefined;
  readonly significant?: number;
}) {
  const origin = useOrigin();
  if (demand === undefined) return <span className="note">–</span>;
  return (
    <span className="figure" tabIndex={-1} data-from={origin(demand)}>
      {quantity(demand.value, demand.unit, significant)}
    </span>
  );
}
