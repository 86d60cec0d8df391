/** What the engine is asked to do on threads of its own: plain values in, plain values out. */
import type { Building } from '@groundward/engine/building/definition';
import type { Result } from '@groundward/engine/building/fault';
import { readBuilding, readBuildingText } from '@groundward/engine/building/read';
import { compareWithCauses } from '@groundward/engine/compare/causes';
import type { Compared } from '@groundward/engine/compare/compare';
import type { Comparison } from '@groundward/engine/compare/result';
import { analyse } from '@groundward/engine/path/analyse';
import type { Analysis } from '@groundward/engine/path/result';
import { workingContext } from '@groundward/engine/working/context';
import { demandFor, explain, type Wanted } from '@groundward/engine/working/explain';
import type { Working } from '@groundward/engine/working/result';

/** A building and its analysis. */
export type Checked = { readonly building: Building; readonly analysis: Analysis };

export const tasks = {
  /** A building file, as text or as what was parsed from it: read and analysed, or every fault. */
  check: (file: { readonly text: string } | { readonly document: unknown }): Result<Checked> => {
    const read = 'text' in file ? readBuildingText(file.text) : readBuilding(file.document);
    if (!read.ok) return read;
    const analysis = analyse(read.value);
    return analysis.ok ? { ok: true, value: { building: read.value, analysis: analysis.value } } : analysis;
  },
  causes: ({ before, after }: { readonly before: Compared; readonly after: Compared }): Comparison =>
    compareWithCauses(before, after),
  /** The working behind a demand, or why there is none. */
  working: ({ building, wanted }: { readonly building: Building; readonly wanted: Wanted }): Result<Working> => {
    const context = workingContext(building);
    if (!context.ok) return context;
    const demand = demandFor(context.value, wanted);
    return demand.ok ? { ok: true, value: explain(context.value, demand.value) } : demand;
  },
} as const;

export type TaskName = keyof typeof tasks;
export type TaskInput<Name extends TaskName> = Parameters<(typeof tasks)[Name]>[0];
export type TaskOutput<Name extends TaskName> = ReturnType<(typeof tasks)[Name]>;

export type Order = { readonly name: TaskName; readonly input: unknown };
export type Answer = { readonly ok: true; readonly output: unknown } | { readonly ok: false; readonly error: unknown };
