'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Change, Comparison } from '@groundward/engine/compare/result';
import { useMemo } from 'react';
import { ElevationDrawing } from '@/drawings/elevation';
import { PlanDrawing, planBox } from '@/drawings/plan';
import type { Mark } from '@/drawings/plan-lines';
import { boxOf, fitWidth } from '@/drawings/scale';
import { useWidth } from '@/drawings/use-width';
import { COLOURS, gonePiers, pierKeys, SIGNS, sizeOf } from '@/lib/changes';
import { levelName, levelsAscending } from '@/lib/demands';
import { percent, words } from '@/lib/format';
import { useQueryChoice, useQueryState } from '@/lib/query-state';
import { Select } from './select';

/** Piers on plan and elevation, marked by the class of the largest change of one of their quantities; piers that are gone, broken. */
export function ComparisonDrawings({
  comparison,
  before,
  after,
}: {
  readonly comparison: Comparison;
  readonly before: Building;
  readonly after: Building;
}) {
  const levels = levelsAscending(after).slice(1);
  const [level, setLevel] = useQueryChoice(
    'level',
    levels.map(({ id }) => id),
    levels[0]?.id ?? '',
  );
  const [lineId, setLine] = useQueryState('line', firstChanged(comparison) ?? after.wallLines[0]?.id ?? '');
  const [what, setWhat] = useQueryState('mark', 'unit-shear');
  const line = after.wallLines.find(({ id }) => id === lineId) ?? after.wallLines[0];
  const [ref, width] = useWidth<HTMLDivElement>();
  const quantities = useMemo(
    () => [...new Set(comparison.changes.filter(({ kind }) => kind === 'pier').map((change) => change.quantity))],
    [comparison],
  );
  const marks = useMemo(() => marksOf(comparison, what, pierKeys(before)), [comparison, what, before]);
  const gone = useMemo(() => gonePiers(before, after), [before, after]);
  const box = boxOf(planBox(after));
  const each = width > 900 ? (width - 24) / 2 : width;
  return (
    <section className="panel">
      <div className="bar">
        <Select
          label="Piers marked by"
          value={what}
          options={quantities.map((value) => ({ value, name: words(value) }))}
          onChange={setWhat}
        />
        <Select
          label="Plan of"
          value={level}
          options={levels.map(({ id }) => ({ value: id, name: levelName(after, id) }))}
          onChange={setLevel}
        />
        <Select
          label="Elevation of"
          value={line?.id ?? ''}
          options={after.wallLines.map(({ id, name }) => ({ value: id, name: name ?? id }))}
          onChange={setLine}
        />
        <span className="note">
          Marked by the largest change over all cases: {SIGNS.raised} raised, {SIGNS.lowered} lowered, {SIGNS.added}{' '}
          added, {SIGNS.removed} gone
        </span>
      </div>
      <div ref={ref} className="pair">
        {width > 0 && (
          <>
            <PlanDrawing
              plan={{ building: after, level, marks, gone, shown: line?.id }}
              box={box}
              scale={fitWidth(box, each, { left: 34, right: 24, top: 26, bottom: 44 }, 420)}
              onPick={setLine}
            />
            {line !== undefined && (
              <div className="scroll">
                <ElevationDrawing view={{ building: after, line, marks, gone }} width={Math.max(each, 520)} />
              </div>
            )}
          </>
        )}
      </div>
    </section>
  );
}

function firstChanged(comparison: Comparison): string | undefined {
  return comparison.changes
    .find(({ kind, class: name }) => kind === 'pier' && name !== 'unchanged')
    ?.member.split('/')[0];
}

function marksOf(comparison: Comparison, what: string, before: ReadonlySet<string>): ReadonlyMap<string, Mark> {
  const largest = new Map<string, Change>();
  for (const change of comparison.changes) {
    if (change.kind !== 'pier' || change.quantity !== what) continue;
    // A pier that was there may get a force in a case that it had none in: that does not make it a new pier.
    if (change.class === 'added' && before.has(change.member)) continue;
    const known = largest.get(change.member);
    if (known === undefined || sizeOf(change) > sizeOf(known)) largest.set(change.member, change);
  }
  return new Map(
    [...largest]
      .filter(([, change]) => change.class !== 'unchanged')
      .map(([member, change]) => [
        member,
        {
          colour: COLOURS[change.class],
          sign: SIGNS[change.class],
          says: `${words(what)} ${change.class}, at most by ${percent(sizeOf(change))}`,
        },
      ]),
  );
}
