/**
 * The vertical way: overturning of stacked piers, end posts, gravity, and what lands where. Every force is carried as components
 * (gravity D, L, Lr, S, then each load sub-case for sense 1), compression positive, and nothing is dropped on the way down.
 */
import type { GravityCase, Point } from '../building/definition.js';
import { cross } from '../geometry/frame.js';
import type { Model } from '../path/model.js';
import { pointOn, type LineModel, type PierModel, type StoreyModel } from './wall-line.js';

export const GRAVITY: readonly GravityCase[] = ['D', 'L', 'Lr', 'S'];

/** Force by component, compression positive [force]. */
export type Components = Float64Array;

export type PierFeet = {
  readonly line: LineModel;
  readonly storey: StoreyModel;
  readonly pier: PierModel;
  /** Compression at the foot of the near and the far end post. */
  readonly near: Components;
  readonly far: Components;
};

/** An end post's force on its way down. */
export type Column = {
  /** The end post where it starts: `line/under/pier/from` or `…/to`. */
  readonly key: string;
  readonly line: LineModel;
  readonly at: number;
  readonly place: Point;
  readonly force: Components;
};

export type Landing = {
  /** `stands` on an end post, `within` a pier between its posts, on `another-line`, or `nothing`. */
  readonly on: 'stands' | 'within' | 'another-line' | 'nothing';
  readonly column: Column;
  /** Level at which it lands. */
  readonly level: number;
  /** The pier on which it lands. */
  readonly foot?: PierFeet;
};

export type PostDescent = {
  /** By level index of the storey. */
  readonly feet: readonly (readonly PierFeet[])[];
  readonly landings: readonly Landing[];
  /** Posts that reach the base without a pier below them. */
  readonly carried: readonly Column[];
};

/**
 * @param shear     shear of a line in a storey by component [force]; gravity components are zero
 * @param size      number of components
 * @param push      puts a further force on a pier's end posts before anything else lands there
 * Source: statics of a cantilever wall; M = V·h + moment from above, end posts at the arm of the pier.
 */
export function descendPosts(
  model: Model,
  shear: (line: LineModel, level: number) => Components,
  size: number,
  gravity: 'with-gravity' | 'without-gravity' = 'with-gravity',
  push?: (foot: PierFeet) => void,
): PostDescent {
  const feet: PierFeet[][] = model.levels.map(() => []);
  const landings: Landing[] = [];
  const carriedOnce = new Set<string>();
  let columns: Column[] = [];
  for (let level = model.levels.length - 1; level > 0; level--) {
    const storeyFeet = feet[level] as PierFeet[];
    for (const line of model.lines) {
      const storey = line.storeys[level];
      if (storey === undefined) continue;
      for (const pier of storey.piers) {
        const foot = footOf(line, storey, pier, shear(line, level), size, gravity === 'with-gravity');
        push?.(foot);
        storeyFeet.push(foot);
      }
    }
    const onward: Column[] = [];
    for (const column of columns) {
      const landing = land(model, column, storeyFeet, level);
      if (landing.on !== 'nothing') landings.push(landing);
      else {
        onward.push(column);
        // Reported where it first finds nothing, not again in every storey below.
        if (!carriedOnce.has(column.key)) landings.push(landing);
        carriedOnce.add(column.key);
      }
    }
    for (const foot of storeyFeet) {
      const { line, pier } = foot;
      onward.push(
        { key: `${pier.key}/from`, line, at: pier.posts[0], place: pointOn(line, pier.posts[0]), force: foot.near },
        { key: `${pier.key}/to`, line, at: pier.posts[1], place: pointOn(line, pier.posts[1]), force: foot.far },
      );
    }
    columns = onward;
  }
  const lowest = new Set((feet[1] ?? []).flatMap((foot) => [`${foot.pier.key}/from`, `${foot.pier.key}/to`]));
  return { feet, landings, carried: columns.filter((column) => !lowest.has(column.key)) };
}

/** The pier's own storey: couple of its shear, gravity on its top shared by statics. */
function footOf(
  line: LineModel,
  storey: StoreyModel,
  pier: PierModel,
  shear: Components,
  size: number,
  weighed: boolean,
): PierFeet {
  const near = new Float64Array(size);
  const far = new Float64Array(size);
  for (let c = weighed ? GRAVITY.length : 0; c < size; c++) {
    const couple = ((shear[c] as number) * pier.share * pier.height) / pier.arm;
    near[c] = -couple;
    far[c] = couple;
  }
  const middle = (pier.from + pier.to) / 2;
  for (const load of weighed ? (pier.pier.gravity ?? []) : []) {
    const c = GRAVITY.indexOf(load.case);
    const force = load.perLength * pier.length;
    const farPart = (middle - pier.posts[0]) / pier.arm;
    near[c] = (near[c] as number) + force * (1 - farPart);
    far[c] = (far[c] as number) + force * farPart;
  }
  return { line, storey, pier, near, far };
}

function land(model: Model, column: Column, feet: readonly PierFeet[], level: number): Landing {
  const { line, at } = column;
  let within: PierFeet | undefined;
  let stands: PierFeet | undefined;
  let nearest = model.postTolerance;
  for (const foot of feet) {
    if (foot.line !== line) continue;
    const [a, b] = foot.pier.posts;
    const gap = Math.min(Math.abs(at - a), Math.abs(at - b));
    if (gap <= nearest + 1e-12 * model.extent) {
      nearest = Math.min(gap, nearest);
      stands = foot;
    } else if (at >= foot.pier.from && at <= foot.pier.to) within = foot;
  }
  const own = stands ?? within;
  if (own !== undefined) {
    share(own, at, column.force);
    return { on: stands === undefined ? 'within' : 'stands', column, level, foot: own };
  }
  const other = crossing(feet, column, 1e-9 * model.extent);
  if (other !== undefined) {
    share(other.foot, other.distance, column.force);
    return { on: 'another-line', column, level, foot: other.foot };
  }
  return { on: 'nothing', column, level };
}

/** The pier of another line that stands under a post; the one most square to the post's own line where there are several. */
function crossing(
  feet: readonly PierFeet[],
  column: Column,
  tolerance: number,
): { foot: PierFeet; distance: number } | undefined {
  let best: { foot: PierFeet; distance: number; square: number } | undefined;
  for (const foot of feet) {
    const distance = distanceOn(foot, column.place, tolerance);
    if (distance === undefined) continue;
    const square = Math.abs(cross(foot.line.along, column.line.along));
    if (
      best === undefined ||
      square > best.square + 1e-9 ||
      (square > best.square - 1e-9 && foot.pier.length > best.foot.pier.length)
    ) {
      best = { foot, distance, square };
    }
  }
  return best;
}

/** Distance along a pier's axis of a place in its plane and between its ends, or undefined. */
function distanceOn(foot: PierFeet, place: Point, tolerance: number): number | undefined {
  const [x, y] = foot.line.line.axis[0];
  const [ux, uy] = foot.line.along;
  const dx = place[0] - x;
  const dy = place[1] - y;
  if (Math.abs(dx * uy - dy * ux) > tolerance) return undefined;
  const distance = dx * ux + dy * uy;
  return distance >= foot.pier.from - tolerance && distance <= foot.pier.to + tolerance ? distance : undefined;
}

/** A force on a pier goes to its two end posts by statics. */
function share(foot: PierFeet, at: number, force: Components): void {
  const farPart = (at - foot.pier.posts[0]) / foot.pier.arm;
  for (let c = 0; c < force.length; c++) {
    const f = force[c] as number;
    foot.near[c] = (foot.near[c] as number) + f * (1 - farPart);
    foot.far[c] = (foot.far[c] as number) + f * farPart;
  }
}
