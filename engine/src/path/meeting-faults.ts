/** Faults between wall lines and diaphragms: a line that meets no floor, a floor that nothing holds along a load. */
import type { Building } from '../building/definition.js';
import type { Fault } from '../building/fault.js';
import { dot, parallel, PARALLEL, unitVector } from '../geometry/frame.js';
import { tOn, type LineModel } from '../walls/wall-line.js';
import { buildModel, type Model } from './model.js';

/** @param building a building without any other fault */
export function meetingFaults(building: Building): Fault[] {
  const model = buildModel(building);
  const faults: Fault[] = [];
  for (const line of model.lines) {
    line.storeys.forEach((storey, level) => {
      if (storey === undefined) return;
      const { diaphragms, id } = model.levels[level] as (typeof model.levels)[number];
      if (diaphragms.length === 0) return;
      if (diaphragms.some((diaphragm) => diaphragm.touches.some((touch) => touch.line === line))) return;
      const index = line.line.storeys.findIndex((candidate) => candidate.under === id);
      faults.push({
        code: 'line-meets-no-diaphragm',
        path: `wallLines[${line.index}].storeys[${index}]`,
        found: `wall line ${line.line.id}, whose axis runs along no diaphragm of level ${id}`,
        expected: 'an axis through, or along the edge of, a diaphragm of the level that it holds',
      });
    });
  }
  for (const line of model.lines) faults.push(...collectorFaults(model, line));
  building.loadCases.forEach((loadCase, c) => {
    if (loadCase.from === 'combined') return;
    const direction = unitVector(loadCase.direction);
    for (const level of model.levels) {
      const pushed =
        loadCase.from === 'basis' ||
        loadCase.forces.some(
          (force) => force.level === level.id && (force.force !== 0 || (force.diaphragmForce ?? 0) !== 0),
        );
      if (!pushed) continue;
      for (const diaphragm of level.diaphragms) {
        const resists = diaphragm.touches.some(
          ({ line }) =>
            line.storeys[level.index] !== undefined &&
            (diaphragm.behaviour === 'flexible' || diaphragm.behaviour === 'envelope'
              ? parallel(line.along, direction)
              : Math.abs(dot(line.along, direction)) > PARALLEL),
        );
        if (resists) continue;
        faults.push({
          code: 'no-wall-line-along',
          path: diaphragm.path,
          found: `diaphragm ${diaphragm.key} without a wall line along ${loadCase.direction}° in the storey under it, for load case ${loadCase.id} (loadCases[${c}])`,
          expected:
            diaphragm.behaviour === 'rigid' || diaphragm.behaviour === 'semi-rigid'
              ? 'wall lines with resistance along the load'
              : 'two or more wall lines parallel to the load',
        });
      }
    }
  });
  return faults;
}

/** A stated collector that runs beside every diaphragm of its level would leave the line without one. */
function collectorFaults(model: Model, line: LineModel): Fault[] {
  return (line.line.collectors ?? []).flatMap(({ level, from, to }, c): Fault[] => {
    const ends = [tOn(line, from), tOn(line, to)] as const;
    const low = Math.min(...ends);
    const high = Math.max(...ends);
    const diaphragms = model.levels.find(({ id }) => id === level)?.diaphragms ?? [];
    const meets = diaphragms
      .flatMap((diaphragm) => diaphragm.touches)
      .filter((touch) => touch.line === line)
      .some(({ cut }) => [...cut.left, ...cut.right].some(([a, b]) => Math.min(b, high) > Math.max(a, low)));
    if (meets) return [];
    return [
      {
        code: 'collector-meets-no-diaphragm',
        path: `wallLines[${line.index}].collectors[${c}]`,
        found: `a collector from ${from} to ${to}, where no diaphragm of level ${level} lies along line ${line.line.id}`,
        expected: 'a collector along the cut of a diaphragm of its level',
      },
    ];
  });
}
