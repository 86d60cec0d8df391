/** The building files of test/buildings, analysed. */
import { readFileSync } from 'node:fs';
import type { Building } from '@groundward/engine/building/definition';
import { readBuildingText } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import type { Analysis, DiaphragmDiagram, Quantity, Sense } from '@groundward/engine/path/result';

export type Case = { readonly building: Building; readonly analysis: Analysis };

export function analysed(name: string): Case {
  const read = readBuildingText(readFileSync(new URL(`../buildings/${name}.json`, import.meta.url), 'utf8'));
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const result = analyse(read.value);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return { building: read.value, analysis: result.value };
}

export function value(
  { analysis }: Case,
  member: string,
  quantity: Quantity,
  caseId: string,
  sense: Sense = 1,
  combination?: string,
): number {
  const row = analysis.demands.find(
    (demand) =>
      demand.member === member &&
      demand.quantity === quantity &&
      demand.case === caseId &&
      demand.sense === sense &&
      demand.combination === combination,
  );
  if (row === undefined) throw new Error(`no demand ${member} ${quantity} ${caseId}`);
  return row.value;
}

function at(c: readonly number[], x: number): number {
  return c.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
}

/** V, v, M and chord force just before and just after a place of a diaphragm. */
export function beside({ analysis }: Case, diaphragm: string, caseId: string, s: number) {
  const diagram = analysis.diagrams.find(
    (each): each is DiaphragmDiagram => each.kind === 'diaphragm' && each.member === diaphragm && each.case === caseId,
  );
  const read = (piece: DiaphragmDiagram['pieces'][number] | undefined) => {
    if (piece === undefined) return undefined;
    const x = s - piece.from;
    const V = at(piece.shear, x);
    const M = at(piece.moment, x);
    return { V, v: V / at(piece.depth, x), M, chord: M / at(piece.chordDepth, x) };
  };
  return {
    before: read(diagram?.pieces.find((piece) => Math.abs(piece.to - s) < 1e-9)),
    after: read(diagram?.pieces.find((piece) => Math.abs(piece.from - s) < 1e-9)),
  };
}
