/** The inner forces of every diaphragm of a level, along the load and along the walls that stop there. */
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import { innerForces, type InnerForces } from '../diaphragms/inner-forces.js';
import type { InnerByFrame } from './collectors.js';
import type { LevelOutcome } from './descent.js';

/** @param frame index of the frame along which the level is pushed */
export function innerByFrame(outcome: LevelOutcome, frame: number): InnerByFrame {
  const inner = new Map<DiaphragmModel, Map<number, InnerForces>>();
  for (const { diaphragm, pushed, given, taken, rigid } of outcome.diaphragms) {
    const frames = new Set([frame]);
    if (rigid === undefined) for (const [line, force] of taken) if (force[0] !== 0) frames.add(line.family);
    const byFrame = new Map<number, InnerForces>();
    inner.set(diaphragm, byFrame);
    for (const along of frames) {
      const factor = along === frame ? (pushed.force[0] as number) : 0;
      const load = {
        pieces: factor === 0 ? [] : pushed.inertia.load.pieces.map((p) => ({ ...p, w: p.w.map((w) => w * factor) })),
        points: factor === 0 ? [] : pushed.inertia.load.points.map((p) => ({ s: p.s, force: p.force * factor })),
      };
      const lines = [...new Set([...given.keys(), ...taken.keys()])]
        .filter((line) => rigid !== undefined || line.family === along)
        .map((line) => ({ line, given: given.get(line)?.[0] ?? 0, taken: taken.get(line)?.[0] ?? 0 }));
      byFrame.set(along, innerForces(diaphragm, along, load, lines));
    }
  }
  return inner;
}
