/** What sharing by deflection lacks: a deflection of every pier of the line. */
import type { Building } from '../building/definition.js';
import type { Fault } from '../building/fault.js';
import { referenceUnitShear, assembliesOf } from './wall-assembly.js';

export function sharingFaults(building: Building): Fault[] {
  if (building.wallLines.every((line) => line.shareBy !== 'deflection')) return [];
  const { walls } = assembliesOf(building);
  return building.wallLines.flatMap((line, l) =>
    line.shareBy !== 'deflection'
      ? []
      : line.storeys.flatMap((storey, s) =>
          storey.piers.flatMap((pier, p): Fault[] => {
            if (pier.stiffness !== undefined) return [];
            const wall = pier.assembly === undefined ? undefined : walls.get(pier.assembly);
            const lacks =
              wall === undefined
                ? 'a wall assembly'
                : wall.nailed !== undefined
                  ? referenceUnitShear(wall.nominalUnitShear, wall.edition) === undefined
                    ? 'a nominal unit shear in its assembly, at which its four-term deflection is made linear'
                    : undefined
                  : wall.shearStiffness === undefined
                    ? 'an apparent shear stiffness in its assembly'
                    : undefined;
            if (lacks === undefined) return [];
            return [
              {
                code: 'no-deflection',
                path: `wallLines[${l}].storeys[${s}].piers[${p}].assembly`,
                found: `pier ${pier.id} on line ${line.id}, which shares by deflection, without ${lacks}`,
                expected: 'an assembly with a shear stiffness, or a stated stiffness, on every pier of the line',
              },
            ];
          }),
        ),
  );
}
