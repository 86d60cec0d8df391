'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Analysis, CollectorDiagram, Sense } from '@groundward/engine/path/result';
import { useMemo } from 'react';
import { boxOf, fitWidth } from '@/drawings/scale';
import { PlanDrawing, planBox, type PlanView } from '@/drawings/plan';
import { AXIS, CAPTION, SpanDiagrams, type SpanDiagramsView } from '@/drawings/span-diagrams';
import { useWidth } from '@/drawings/use-width';
import { casesOf, diagramsOf, levelsAscending, type DemandIndex } from '@/lib/demands';
import { pointsOf } from '@/lib/polynomial';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { CollectorTable, LevelFigures, SpanTable } from '@/parts/level-tables';
import { Pending } from '@/parts/problem';
import { CaseSense, Select } from '@/parts/select';

export default function LevelPage() {
  const { building, analysis, index, error } = useRevision();
  if (building === undefined || analysis === undefined || index === undefined)
    return <Pending error={error} what="the analysis" />;
  return <LevelView building={building} analysis={analysis} index={index} />;
}

function LevelView({
  building,
  analysis,
  index,
}: {
  readonly building: Building;
  readonly analysis: Analysis;
  readonly index: DemandIndex;
}) {
  const cases = casesOf(analysis);
  const levels = levelsAscending(building).slice(1).reverse();
  const [level, setLevel] = useQueryState('level', levels[0]?.id ?? '');
  const [caseId, setCase] = useQueryState('case', cases[0] ?? '');
  const [senseText, setSense] = useQueryState('sense', '1');
  const [shown, setShown] = useQueryState('line', '');
  const sense: Sense = senseText === '-1' ? -1 : 1;
  const diagrams = useMemo(() => diagramsOf(analysis, level, caseId), [analysis, level, caseId]);
  const collectors = useMemo(
    () =>
      analysis.diagrams.filter(
        (diagram): diagram is CollectorDiagram =>
          diagram.kind === 'collector' && diagram.level === level && diagram.case === caseId,
      ),
    [analysis, level, caseId],
  );
  const along = diagrams[0]?.along;
  const load: [number, number] | undefined = along === undefined ? undefined : [along[0] * sense, along[1] * sense];
  const main = diagrams.filter(
    (diagram) => along !== undefined && Math.abs(diagram.along[0] * along[0] + diagram.along[1] * along[1]) > 0.999,
  );
  const plan: PlanView = {
    building,
    level,
    load,
    shown,
    collectors: collectors.map((collector) => ({
      line: collector.line,
      points: collector.points.map(({ at, axial }) => ({ at, axial: axial * sense })),
    })),
  };
  const upright = along !== undefined && Math.abs(along[0]) > Math.abs(along[1]);
  const view: Omit<SpanDiagramsView, 'from' | 'to'> = {
    points: main.flatMap((diagram) => pointsOf(diagram, sense)).sort((a, b) => a.s - b.s),
    lines: main.flatMap((diagram) => diagram.lines),
    units: building.units,
  };
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
      <div className="split">
        <div className="wide">
          <PlanWithDiagrams
            plan={plan}
            view={view}
            upright={upright}
            onPick={(line) => setShown(line === shown ? '' : line)}
          />
          <ul className="legend">
            <li>
              <span className="swatch" style={{ color: 'var(--tension)' }} />
              collector in tension
            </li>
            <li>
              <span className="swatch dash" style={{ color: 'var(--compression)' }} />
              collector in compression
            </li>
            <li>
              <span className="swatch" style={{ color: 'var(--wall)', borderTopWidth: 5 }} />
              pier under the level
            </li>
            <li>shear, chords and collectors are those of the diaphragm design forces</li>
          </ul>
        </div>
        <div className="stack wide">
          <LevelFigures index={index} level={level} caseId={caseId} sense={sense} />
          <SpanTable analysis={analysis} level={level} caseId={caseId} sense={sense} />
          <CollectorTable
            building={building}
            index={index}
            level={level}
            caseId={caseId}
            sense={sense}
            shown={shown}
            onPick={setShown}
          />
        </div>
      </div>
    </>
  );
}

/** Diagrams stand under the plan where the span runs across the sheet, beside it where it runs up the sheet. */
function PlanWithDiagrams({
  plan,
  view,
  upright,
  onPick,
}: {
  readonly plan: PlanView;
  readonly view: Omit<SpanDiagramsView, 'from' | 'to'>;
  readonly upright: boolean;
  readonly onPick: (line: string) => void;
}) {
  const [ref, width] = useWidth<HTMLDivElement>();
  const box = boxOf(planBox(plan.building));
  const beside = upright && width > 700;
  const margin = { left: AXIS, right: 20, top: beside ? CAPTION + 4 : 34, bottom: 42 };
  // Along y the plan is kept low enough for the diagrams under it to be seen with it.
  const scale = fitWidth(box, beside ? width * 0.6 : width, margin, beside ? 560 : 420);
  const extent = upright ? { from: box.y0, to: box.y1 } : { from: box.x0, to: box.x1 };
  return (
    <div ref={ref}>
      {width > 0 &&
        (beside ? (
          <div style={{ display: 'flex', gap: 12 }}>
            <PlanDrawing plan={plan} scale={scale} box={box} onPick={onPick} />
            <div style={{ flex: 1, minWidth: 0, marginTop: margin.top - CAPTION }}>
              <SpanDiagrams view={{ ...view, ...extent }} upright length={scale.height - margin.top - margin.bottom} />
            </div>
          </div>
        ) : (
          <div style={{ width: Math.min(scale.width, width) }}>
            <PlanDrawing plan={plan} scale={scale} box={box} onPick={onPick} />
            <SpanDiagrams view={{ ...view, ...extent }} upright={false} length={0} />
          </div>
        ))}
    </div>
  );
}
