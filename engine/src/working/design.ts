/** The diaphragm design set behind a working: the same operation that filled the table, made once for a level and case. */
import type { InnerForces } from '../diaphragms/inner-forces.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import { designSet } from '../path/design-set.js';
import type { DiaphragmOutcome, LevelOutcome } from '../path/descent.js';
import { innerByFrame } from '../path/inner-by-frame.js';
import type { LineModel } from '../walls/wall-line.js';
import { runOf, type Context } from './context.js';

export type Design = {
  readonly outcome: LevelOutcome;
  readonly inner: ReadonlyMap<DiaphragmModel, ReadonlyMap<number, InnerForces>>;
};

const made = new WeakMap<Context, Map<string, Design>>();

export function designOf(context: Context, caseId: string, level: number): Design {
  let known = made.get(context);
  if (known === undefined) made.set(context, (known = new Map<string, Design>()));
  const key = `${level} ${caseId}`;
  let design = known.get(key);
  if (design === undefined) {
    const run = runOf(context, caseId);
    const storey = run.outcomes[level];
    if (storey === undefined) throw new Error(`no level ${level} under ${caseId}`);
    const outcome = designSet(
      context.model,
      context.bodies,
      run,
      storey,
      context.requirements.get(run.subCase.loadCase.id),
    );
    known.set(key, (design = { outcome, inner: innerByFrame(outcome, run.subCase.frame) }));
  }
  return design;
}

/** How much more of a wall's shear from above enters the design set than the storey set: Ω₀ or ρ where the standard raises transfers. */
export function raisedBy(context: Context, caseId: string, level: number, line: LineModel): number {
  const plain = runOf(context, caseId).outcomes[level]?.above[line.index]?.[0] ?? 0;
  const raised = designOf(context, caseId, level).outcome.above[line.index]?.[0] ?? 0;
  return plain === 0 || Math.abs(raised / plain - 1) < 1e-12 ? 1 : raised / plain;
}

/** `level/diaphragm/…`: the diaphragm of a span or an opening. */
export function diaphragmOf(
  context: Context,
  caseId: string,
  member: string,
): { outcome: DiaphragmOutcome; inner: readonly InnerForces[] } {
  const [level = '', diaphragm = ''] = member.split('/');
  const index = context.model.levels.findIndex(({ id }) => id === level);
  const design = designOf(context, caseId, index);
  const outcome = design.outcome.diaphragms.find(({ diaphragm: each }) => each.key === `${level}/${diaphragm}`);
  if (outcome === undefined) throw new Error(`no diaphragm of ${member}`);
  return { outcome, inner: [...(design.inner.get(outcome.diaphragm)?.values() ?? [])] };
}
