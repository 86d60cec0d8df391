import type { Building } from '@groundward/engine/building/definition';
import type { Demand } from '@groundward/engine/path/result';

/** The level at which, or under which, a demand's member stands; supports stand at the base. */
export function levelOfDemand(building: Building): (demand: Demand) => string {
  const base = [...building.levels].sort((a, b) => a.elevation - b.elevation)[0]?.id ?? '';
  return ({ kind, member }) => {
    const parts = member.split('/');
    if (kind === 'support') return base;
    return (kind === 'wall-line' || kind === 'pier' ? parts[1] : parts[0]) ?? '';
  };
}
