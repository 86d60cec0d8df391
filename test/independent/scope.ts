/** Which building files the independent solution answers: it reads what stands here and nothing else. */
import type { Building } from '@groundward/engine/building/definition';
import { cross } from './plan.js';

const READ = new Set(
  [
    'schema name units length force levels id elevation diaphragms outline openings behaviour assembly weight area zones lines along',
    'perLength wallLines axis shareBy storeys under piers from to stiffness endOffset gravity case assemblies walls holdDown holdDowns',
    'nominalUnitShear seismic wind apparentShearStiffness chordStiffness axialStiffness allowableTension deflectionAtAllowable',
    'basis standard SDS SD1 S1 R overstrength Cd importance redundancy designCategory loadCases kind direction level',
    'diaphragmForce spread accidental ratio amplified combinations factors D L Lr S E W collectors postTolerance meshSize forces',
  ].flatMap((line) => line.split(' ')),
);

/** Why the independent solution does not answer for a building, or undefined where it does. */
export function outOfScope(building: Building): string | undefined {
  const unread = [...keysOf(building)].filter((key) => !READ.has(key));
  if (unread.length > 0) return `key ${unread.join(', ')}`;
  const floors = building.levels.flatMap((level) => level.diaphragms ?? []);
  const other = floors.find(({ behaviour = 'flexible' }) => behaviour !== 'flexible' && behaviour !== 'rigid');
  if (other !== undefined) return `behaviour ${other.behaviour}`;
  if (building.wallLines.some(({ shareBy }) => shareBy === 'deflection')) return 'sharing by deflection';
  for (const loadCase of building.loadCases) {
    if (loadCase.from === 'combined') return 'cases that act together';
    if (loadCase.from === 'basis' && loadCase.kind !== 'seismic') return 'wind from a basis';
    const angle = (loadCase.direction * Math.PI) / 180;
    for (const { axis } of building.wallLines) {
      const [dx, dy] = [axis[1][0] - axis[0][0], axis[1][1] - axis[0][1]];
      const sine = Math.abs(cross([dx, dy], [Math.cos(angle), Math.sin(angle)])) / Math.hypot(dx, dy);
      const square = sine < 1e-6 || Math.abs(sine - 1) < 1e-9;
      if (!square && floors.some(({ behaviour = 'flexible' }) => behaviour === 'flexible')) return 'walls askew';
    }
  }
  return undefined;
}

function* keysOf(value: unknown): Generator<string> {
  if (Array.isArray(value)) for (const each of value as unknown[]) yield* keysOf(each);
  else if (typeof value === 'object' && value !== null) {
    for (const [key, each] of Object.entries(value)) {
      yield key;
      yield* keysOf(each);
    }
  }
}
