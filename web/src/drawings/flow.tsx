'use client';
import type { Flow, FlowLevel, FlowStep } from '@/lib/flow';
import { figure, quantity, withSign } from '@/lib/format';
import { bandPath, keptPath, layOut, releasedPath, through, turnPaths, type FlowLayout } from './flow-shapes';
import { Picked } from './picked';

export type FlowView = {
  readonly flow: Flow;
  readonly unit: string;
  /** The member that is followed, and all that its force comes from and goes to. */
  readonly shown: string;
  readonly lit: ReadonlySet<string> | undefined;
};

/**
 * The whole building with its horizontal forces going down. On every level a mass gives its force to the diaphragm, which hands it to
 * the wall lines from left to right until nothing is left; every line carries what it got down, storey by storey, to its supports.
 * All widths are forces on one scale; a broken edge means against the load.
 */
export function FlowDrawing({
  view,
  width,
  onPick,
}: {
  readonly view: FlowView;
  readonly width: number;
  readonly onPick: (member: string) => void;
}) {
  const layout = layOut(view.flow, width);
  const last = view.flow.levels.length - 1;
  return (
    <svg width={layout.width} height={layout.height} role="group" aria-label="Horizontal forces down the building">
      {view.flow.levels.map((level, i) => (
        <LevelFlow key={level.id} view={view} level={level} i={i} last={i === last} layout={layout} onPick={onPick} />
      ))}
      <Feet view={view} layout={layout} onPick={onPick} />
      {view.flow.columns.map(({ line, across }, c) => (
        <text key={line.id} x={layout.x(c)} y={12} textAnchor="middle" className={across ? 's12' : 's12 t-ink'}>
          {line.id}
        </text>
      ))}
      {view.flow.columns.some(({ across }) => across) && (
        <text
          x={layout.x(view.flow.columns.findIndex(({ across }) => across)) - 10}
          y={layout.height - 4}
          className="s10"
        >
          lines across the load: torsion alone
        </text>
      )}
    </svg>
  );
}

type Part = {
  readonly view: FlowView;
  readonly layout: FlowLayout;
  readonly onPick: (member: string) => void;
};

function tone(view: FlowView, member: string): string {
  if (view.shown === member) return 'flow shown';
  return view.lit === undefined || view.lit.has(member) ? 'flow' : 'flow dim';
}

function LevelFlow({
  view,
  level,
  i,
  last,
  layout,
  onPick,
}: Part & { readonly level: FlowLevel; readonly i: number; readonly last: boolean }) {
  const top = layout.top(i);
  const k = layout.perForce;
  const first = level.steps.find(({ before }) => before !== 0);
  const masses = level.masses.map((mass, m) => ({
    ...mass,
    y: top + k * Math.abs(level.force) * level.masses.slice(0, m).reduce((sum, { part }) => sum + part, 0),
  }));
  return (
    <g>
      <line x1={0} x2={layout.width} y1={top - 0.5} y2={top - 0.5} className="storey" />
      <text x={0} y={top + 13} className="s12 t-ink">
        {level.name}
      </text>
      <text x={0} y={top + 28} className="t-force" data-from={`Storey force of the case on ${level.name}.`}>
        {quantity(Math.abs(level.force), view.unit)}
      </text>
      <text
        x={0}
        y={layout.foot(i) + 38}
        className="s10"
        data-from={`Storey shear under ${level.name}: the storey forces of this level and all above.`}
      >
        {`Σ ${quantity(level.storeyShear, view.unit, 4)}`}
      </text>
      {masses.map(({ member, name, part, y }) => (
        <Picked key={member} label={`Mass of ${name}`} shown={view.shown === member} onPick={() => onPick(member)}>
          <rect
            x={layout.left - 22}
            y={y}
            width={16}
            height={Math.max(2, k * Math.abs(level.force) * part)}
            className={tone(view, member).replace('flow', 'mass')}
          >
            <title>{`Mass of ${name}: ${quantity(Math.abs(level.force) * part, view.unit)}`}</title>
          </rect>
        </Picked>
      ))}
      {first !== undefined && (
        <path
          d={bandPath(layout.left - 6, layout.edge(first.column, -1), top, k * first.before)}
          className={first.before < 0 ? 'flow band against' : 'flow band'}
        />
      )}
      {level.steps.map((step) => (
        <StepFlow
          key={step.column}
          view={view}
          level={level}
          i={i}
          step={step}
          last={last}
          layout={layout}
          onPick={onPick}
        />
      ))}
    </g>
  );
}

function StepFlow({
  view,
  level,
  i,
  step,
  last,
  layout,
  onPick,
}: Part & { readonly level: FlowLevel; readonly i: number; readonly step: FlowStep; readonly last: boolean }) {
  const k = layout.perForce;
  const line = view.flow.columns[step.column]?.line;
  if (line === undefined || (step.shear === 0 && step.above === 0)) return null;
  const stops = step.said.shear === undefined;
  // What arrives where a line stops is the force of the storey above.
  const member = `${line.id}/${(stops ? view.flow.levels[i - 1] : undefined)?.id ?? level.id}`;
  const [top, foot] = [layout.top(i), layout.foot(i)];
  const x = layout.x(step.column);
  const end = last ? layout.ground : layout.top(i + 1);
  const half = (k * Math.abs(step.shear)) / 2;
  const tall = Math.max(2, 2 * half);
  const stroke = step.shear * k < -1e-6 ? ' against' : '';
  const after = level.steps[step.column + 1];
  return (
    <>
      {after !== undefined && step.after !== 0 && Math.abs(k * step.after) > 0.2 && after.before !== 0 && (
        <path
          d={bandPath(layout.edge(step.column, 1), layout.edge(step.column + 1, -1), top, k * step.after)}
          className={step.after < 0 ? 'flow band against' : 'flow band'}
        />
      )}
      <path
        d={bandPath(layout.edge(step.column, -1), layout.edge(step.column, 1), top, k * through(step))}
        className="flow band"
      />
      <Picked
        label={`Wall line ${line.id} under ${level.name}, shear ${quantity(step.said.shear ?? 0, view.unit)}`}
        shown={view.shown === member}
        onPick={() => !stops && onPick(member)}
      >
        <g className={tone(view, member) + stroke}>
          {turnPaths(step, layout, i).map((d) => (
            <path key={d} d={d} />
          ))}
          <path d={keptPath(step, layout, i)} />
          <path d={releasedPath(step, layout, i)} />
          {!stops && <rect x={x - tall / 2} y={foot} width={tall} height={end - foot} />}
        </g>
        {!stops && (
          <rect
            x={layout.edge(step.column, -1)}
            y={foot}
            width={layout.column}
            height={end - foot}
            fill="transparent"
          />
        )}
      </Picked>
      {!stops && <Numbers step={step} x={x} foot={foot} unit={view.unit} line={line.id} level={level.name} />}
      {stops && (
        <text x={x} y={foot + 10} textAnchor="middle" className="s10 t-alarm halo">
          stops
        </text>
      )}
    </>
  );
}

function Numbers({
  step,
  x,
  foot,
  unit,
  line,
  level,
}: {
  readonly step: FlowStep;
  readonly x: number;
  readonly foot: number;
  readonly unit: string;
  readonly line: string;
  readonly level: string;
}) {
  const { reaction, shear } = step.said;
  return (
    <g textAnchor="middle" pointerEvents="none">
      {reaction !== undefined && (
        <text x={x} y={foot + 12} className="s10 halo">
          {withSign(figure(reaction, 3), reaction)}
        </text>
      )}
      <text x={x} y={foot + 38} className="s12 t-ink halo">
        {figure(shear ?? 0, 3)}
        <title>{`Line ${line} under ${level}: shear ${quantity(shear ?? 0, unit)}`}</title>
      </text>
    </g>
  );
}

function Feet({ view, layout, onPick }: Part) {
  const { flow } = view;
  return (
    <g>
      <line x1={0} x2={layout.width} y1={layout.ground} y2={layout.ground} stroke="var(--ink)" strokeWidth={2.5} />
      <text x={0} y={layout.ground + 15} className="s12 t-ink">
        {flow.base}
      </text>
      {layout.feet.map(({ foot, x, d }) => (
        <Picked
          key={foot.member}
          label={`Support of pier ${foot.member}, shear ${quantity(foot.shear, view.unit)}`}
          shown={view.shown === foot.member}
          onPick={() => onPick(foot.member)}
        >
          <path d={d} className={tone(view, foot.member) + (foot.shear * layout.perForce < -1e-6 ? ' against' : '')} />
          <rect
            x={x - 4}
            y={layout.ground + 30}
            width={8}
            height={7}
            className={tone(view, foot.member).replace('flow', 'mass')}
          />
          <title>{`Support ${foot.member}: ${quantity(foot.shear, view.unit)}`}</title>
        </Picked>
      ))}
    </g>
  );
}
