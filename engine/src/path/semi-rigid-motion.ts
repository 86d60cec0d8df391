/** The motion of a semi-rigid diaphragm in an outcome, with the displacements of the wall lines along the load. */
import { supportsOf } from '../diaphragms/flexible.js';
import { motionOf, type Motion, type SpanDeflection } from '../diaphragms/semi-rigid/deflection.js';
import type { DiaphragmOutcome } from './descent.js';

/** @returns undefined for a diaphragm that is not semi-rigid */
export function semiRigidMotion(outcome: DiaphragmOutcome, frame: number): Motion | undefined {
  const membrane = outcome.rigid?.model.semiRigid?.model;
  const displacement = outcome.rigid?.displacement?.[0];
  if (membrane === undefined || displacement === undefined) return undefined;
  const supports = supportsOf(outcome.diaphragm, frame).map((support) => {
    // Lines in one plane move together in a stiff floor; the mean is weighed by what each takes.
    const moves = support.lines.reduce((sum, { line, part }) => {
      const k = line.storeys[outcome.diaphragm.level]?.stiffness ?? Infinity;
      return sum + (part * line.sign * (outcome.given.get(line)?.[0] ?? 0)) / k;
    }, 0);
    return { ...support, moves };
  });
  return motionOf(membrane, displacement, frame, supports, outcome.rigid?.motion[0] ?? [0, 0, 0]);
}

/** The span that bows out most against the drift of its walls. */
export function largestBow(motion: Motion | undefined): SpanDeflection | undefined {
  let worst: SpanDeflection | undefined;
  for (const span of motion?.spans ?? []) {
    if (worst === undefined || ratioOf(span) > ratioOf(worst)) worst = span;
  }
  return worst;
}

export function ratioOf({ deflection, drift }: SpanDeflection): number {
  return drift > 0 ? deflection / drift : deflection > 0 ? Infinity : 0;
}
