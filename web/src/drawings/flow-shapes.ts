/** Where the parts of the force-flow drawing stand, and the outlines of its ribbons. */
import type { Flow, FlowFoot, FlowStep } from '@/lib/flow';

export type FlowLayout = {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly column: number;
  /** Pixels per unit of force, for every ribbon and band. */
  readonly perForce: number;
  readonly x: (column: number) => number;
  /** Left (−1) or right (1) edge of a column. */
  readonly edge: (column: number, side: -1 | 1) => number;
  /** Upper edge of a level's band; where the storey under the level begins. */
  readonly top: (level: number) => number;
  readonly foot: (level: number) => number;
  readonly ground: number;
  readonly feet: readonly { readonly foot: FlowFoot; readonly x: number; readonly d: string }[];
};

const LEFT = 118;
const GAP = 18;
const TOP = 24;
const STOREY = 50;
const FEET = 58;
const MOST_RIBBON = 50;
const MOST_BAND = 54;
const LEAST_COLUMN = 46;
const MOST_COLUMN = 104;

export function layOut(flow: Flow, width: number): FlowLayout {
  const count = Math.max(1, flow.columns.length);
  const parted = flow.columns.findIndex(({ across }) => across);
  const gap = parted > 0 ? GAP : 0;
  const column = Math.min(MOST_COLUMN, Math.max(LEAST_COLUMN, (width - LEFT - gap - 4) / count));
  const steps = flow.levels.flatMap((level) => level.steps);
  const mostShear = Math.max(1e-12, ...steps.map(({ shear }) => Math.abs(shear)));
  const mostBand = Math.max(1e-12, ...flow.levels.map(bandOf));
  const perForce = Math.min(Math.min(MOST_RIBBON, column - 10) / mostShear, MOST_BAND / mostBand);
  const tops: number[] = [];
  const feet: number[] = [];
  let y = TOP;
  for (const level of flow.levels) {
    tops.push(y);
    const foot = y + Math.max(30, perForce * bandOf(level) + 10);
    feet.push(foot);
    y = foot + STOREY;
  }
  const x = (c: number): number => LEFT + column * (c + 0.5) + (parted > 0 && c >= parted ? gap : 0);
  const layout = {
    width: LEFT + column * count + gap + 2,
    height: y + FEET,
    left: LEFT,
    column,
    perForce,
    x,
    edge: (c: number, side: -1 | 1) => x(c) + (side * column) / 2,
    top: (i: number) => tops[i] ?? y,
    foot: (i: number) => feet[i] ?? y,
    ground: y,
  };
  return { ...layout, feet: footPaths(flow, layout) };
}

/** The thickest that the band of a level gets. */
function bandOf({ force, steps }: Flow['levels'][number]): number {
  return Math.max(Math.abs(force), ...steps.map(({ after }) => Math.abs(after)));
}

/** A stretch of the band, `thick` pixels; nothing for a stretch that carries nothing. */
export function bandPath(from: number, to: number, top: number, thick: number): string {
  const t = Math.abs(thick);
  return t < 0.2 ? '' : `M${from},${top}H${to}V${top + t}H${from}Z`;
}

/** What the line gets from the diaphragm, turning down out of the band from the left, from the right or from both. */
export function turnPaths(step: FlowStep, layout: FlowLayout, level: number): string[] {
  const { perForce: k } = layout;
  if (step.reaction <= 0 || step.shear <= 0) return aside(step, layout, level);
  const fromLeft = Math.min(step.reaction, Math.max(0, step.before - Math.max(0, step.after)));
  const left = k * fromLeft;
  const right = k * (step.reaction - fromLeft);
  const x = layout.x(step.column) - (k * step.shear) / 2;
  const [top, foot] = [layout.top(level), layout.foot(level)];
  const paths: string[] = [];
  if (left > 0.2) {
    const low = top + k * step.before;
    const high = low - left;
    paths.push(
      `M${layout.edge(step.column, -1)},${high}H${x}Q${x + left},${high} ${x + left},${low}V${foot}H${x}V${low}H${layout.edge(step.column, -1)}Z`,
    );
  }
  if (right > 0.2) {
    const low = top + k * Math.max(right / k, -step.after);
    const high = low - right;
    const [a, b] = [x + left, x + left + right];
    paths.push(
      `M${layout.edge(step.column, 1)},${high}H${b}Q${a},${high} ${a},${low}V${foot}H${b}V${low}H${layout.edge(step.column, 1)}Z`,
    );
  }
  return paths;
}

/** A line that torsion pushes against the load, or across it: its ribbon begins at the band. */
function aside(step: FlowStep, layout: FlowLayout, level: number): string[] {
  const added = Math.abs(step.shear) - kept(step);
  if (added <= 0) return [];
  const size = Math.max(2, layout.perForce * added);
  const x = layout.x(step.column) - Math.max(2, layout.perForce * Math.abs(step.shear)) / 2;
  return [`M${x},${layout.top(level)}H${x + size}V${layout.foot(level)}H${x}Z`];
}

/** What comes from the storey above and goes on in the line. */
function kept({ above, shear }: FlowStep): number {
  return Math.sign(above) === Math.sign(shear) ? Math.min(Math.abs(above), Math.abs(shear)) : 0;
}

export function keptPath(step: FlowStep, layout: FlowLayout, level: number): string {
  const { perForce: k } = layout;
  const size = k * kept(step);
  if (size < 0.2) return '';
  const x = layout.x(step.column);
  const above = x + (k * Math.abs(step.above)) / 2;
  const below = x + (k * Math.abs(step.shear)) / 2;
  const [top, foot] = [layout.top(level), layout.foot(level)];
  const middle = (top + foot) / 2;
  return `M${above - size},${top}C${above - size},${middle} ${below - size},${middle} ${below - size},${foot}H${below}C${below},${middle} ${above},${middle} ${above},${top}Z`;
}

/** What passes a line on the diaphragm; nothing where the band turns round at it. */
export function through({ before, after }: FlowStep): number {
  return Math.sign(before) === Math.sign(after) ? Math.sign(before) * Math.min(Math.abs(before), Math.abs(after)) : 0;
}

/** What a line that stops, or that torsion relieves, gives back to the diaphragm: it turns into the band, under what passes. */
export function releasedPath(step: FlowStep, layout: FlowLayout, level: number): string {
  const size = layout.perForce * (Math.abs(step.above) - kept(step));
  if (size < 0.2) return '';
  const a = layout.x(step.column) - (layout.perForce * Math.abs(step.above)) / 2;
  const b = a + size;
  const top = layout.top(level);
  const t = top + layout.perForce * Math.abs(through(step));
  return step.after > 0 || step.before >= 0
    ? `M${a},${top}V${t}Q${a},${t + size} ${b},${t + size}H${layout.edge(step.column, 1)}V${t}H${b}V${top}Z`
    : `M${b},${top}V${t}Q${b},${t + size} ${a},${t + size}H${layout.edge(step.column, -1)}V${t}H${a}V${top}Z`;
}

function footPaths(flow: Flow, layout: Omit<FlowLayout, 'feet'>): FlowLayout['feet'] {
  const k = layout.perForce;
  return flow.columns.flatMap((_, c) => {
    const feet = flow.feet.filter((foot) => foot.column === c);
    const sizes = feet.map((foot) => Math.max(1, k * Math.abs(foot.shear)));
    const all = sizes.reduce((sum, size) => sum + size, 0);
    const free = Math.max(0, layout.column - 8 - all);
    let from = layout.x(c) - all / 2;
    let to = layout.x(c) - (all + free) / 2;
    return feet.map((foot, i) => {
      const size = sizes[i] ?? 1;
      const spread = free / feet.length;
      const [a, b] = [from, to + spread / 2];
      from += size;
      to += size + spread;
      const [y0, y1] = [layout.ground, layout.ground + 30];
      const middle = (y0 + y1) / 2;
      const d = `M${a},${y0}C${a},${middle} ${b},${middle} ${b},${y1}H${b + size}C${b + size},${middle} ${a + size},${middle} ${a + size},${y0}Z`;
      return { foot, x: b + size / 2, d };
    });
  });
}
