'use client';
import type { Sense } from '@groundward/engine/path/result';
import { useMemo } from 'react';
import type { CollectorView } from '@/drawings/collector';
import type { PlanView } from '@/drawings/plan';
import { useWidth } from '@/drawings/use-width';
import { casesOf, collectorsOf, diagramsOf, levelsAscending, type Facts } from '@/lib/demands';
import { useQueryChoice, useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { LevelSheet } from '@/parts/level-sheet';
import { BreakTable, CollectorTable, LevelFigures, SpanTable } from '@/parts/level-tables';
import { Pending } from '@/parts/problem';
import { CaseSense, Select } from '@/parts/select';

export default function LevelPage() {
  const { facts, error } = useRevision();
  return facts === undefined ? <Pending error={error} what="the analysis" /> : <LevelView facts={facts} />;
}

const TABLES = 430;

function LevelView({ facts }: { readonly facts: Facts }) {
  const { building, analysis, index } = facts;
  const cases = casesOf(analysis);
  const levels = levelsAscending(building).slice(1).reverse();
  const [level, setLevel] = useQueryChoice(
    'level',
    levels.map(({ id }) => id),
    levels[0]?.id ?? '',
  );
  const [caseId, setCase] = useQueryChoice('case', cases, cases[0] ?? '');
  const [senseText, setSense] = useQueryState('sense', '1');
  const [shown, setShown] = useQueryState('line', '');
  const sense: Sense = senseText === '-1' ? -1 : 1;
  const diagrams = useMemo(() => diagramsOf(analysis, level, caseId), [analysis, level, caseId]);
  const collectors = useMemo<readonly CollectorView[]>(
    () =>
      collectorsOf(analysis, level, caseId).flatMap((diagram) => {
        const line = building.wallLines.find(({ id }) => id === diagram.line);
        if (line === undefined) return [];
        return [{ line, points: diagram.points.map(({ at, axial }) => ({ at, axial: axial * sense })) }];
      }),
    [analysis, building, level, caseId, sense],
  );
  const [ref, width] = useWidth<HTMLDivElement>();
  const pick = (line: string): void => setShown(line === shown ? '' : line);
  const plan: PlanView = { building, level, shown, collectors, ...signsOf(facts, level, caseId, sense) };
  const beside = width > 1100;
  return (
    <>
      <div className="bar">
        <Select
          label="Level"
          value={level}
          options={levels.map((each) => ({ value: each.id, name: each.name ?? each.id }))}
          onChange={setLevel}
        />
        <CaseSense cases={cases} caseId={caseId} sense={sense} onCase={setCase} onSense={setSense} />
      </div>
      <div ref={ref} className={beside ? 'beside' : 'stack'}>
        <div className="wide">
          {width > 0 && (
            <LevelSheet view={{ plan, diagrams, sense }} width={beside ? width - TABLES - 24 : width} onPick={pick} />
          )}
          <Legend rigid={plan.centres !== undefined && plan.centres.length > 0} />
        </div>
        <div className="tables">
          <LevelFigures index={index} level={level} caseId={caseId} sense={sense} />
          <SpanTable analysis={analysis} level={level} caseId={caseId} sense={sense} />
          <CollectorTable
            facts={facts}
            collectors={collectors}
            level={level}
            caseId={caseId}
            sense={sense}
            shown={shown}
            onPick={pick}
          />
          <BreakTable diagrams={diagrams} sense={sense} units={building.units} />
        </div>
      </div>
    </>
  );
}

/** Load arrow, span names and centres of the level. */
function signsOf(
  { analysis, index }: Facts,
  level: string,
  caseId: string,
  sense: Sense,
): Pick<PlanView, 'load' | 'spans' | 'centres'> {
  const diagrams = diagramsOf(analysis, level, caseId);
  const along = diagrams[0]?.along;
  const upright = Math.abs(along?.[0] ?? 0) > Math.abs(along?.[1] ?? 1);
  const centres = (['mass', 'rigidity'] as const).flatMap((of) => {
    const x = index.of(level, `centre-of-${of}-x`, caseId, sense);
    const y = index.of(level, `centre-of-${of}-y`, caseId, sense);
    return x === undefined || y === undefined ? [] : [{ of, at: [x.value, y.value] as const }];
  });
  return {
    load: along === undefined ? undefined : [along[0] * sense, along[1] * sense],
    centres,
    spans: diagrams.flatMap((diagram) =>
      diagram.spans.map(({ member, from, to }) => ({
        member,
        name: member.split('/')[2] ?? member,
        from,
        to,
        upright,
      })),
    ),
  };
}

function Legend({ rigid }: { readonly rigid: boolean }) {
  return (
    <ul className="legend">
      <li>
        <span className="swatch" style={{ color: 'var(--tension)' }} />
        collector in tension, +
      </li>
      <li>
        <span className="swatch dash" style={{ color: 'var(--compression)' }} />
        collector in compression, −
      </li>
      <li>
        <span className="swatch heavy" style={{ color: 'var(--wall)' }} />
        pier under the level
      </li>
      {rigid && <li>quartered disc: centre of mass; crossed ring: centre of rigidity</li>}
      <li>V, M, chords and collectors are those of the diaphragm design forces</li>
    </ul>
  );
}
