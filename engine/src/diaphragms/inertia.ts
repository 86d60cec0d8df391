/** How a level's force lies on its diaphragms: exact load per unit span from outlines, zones, façades and partitions. */
import type { Point } from '../building/definition.js';
import { massWith } from '../geometry/area.js';
import { dot } from '../geometry/frame.js';
import type { Profile } from '../geometry/profile.js';
import type { LoadPiece, PointLoad, SpanLoad } from '../statics/span-load.js';
import { resultant } from '../statics/span-load.js';
import type { DiaphragmModel } from './diaphragm.js';

export type Spread = 'weight' | 'area' | 'even' | 'facade';

/** A load that lies along the cut at `s`, such as a façade that runs with the load. */
export type AlongLoad = { readonly s: number; readonly t0: number; readonly t1: number; readonly force: number };

export type Inertia = {
  readonly diaphragm: DiaphragmModel;
  /** Index of the frame along the load. */
  readonly frame: number;
  /** Load for a level force of 1 [1/length], [1] */
  readonly load: SpanLoad;
  /** The point loads of `load`, with the stretch on which each lies. */
  readonly along: readonly AlongLoad[];
  /** Part of the level's force; the parts of a level add up to 1. */
  readonly share: number;
  /** Place of the resultant along s [length] */
  readonly centre: number;
  /** How the load lies on the floor: `weight` by area weights, zones and lines; `facade` as the load along its edge. */
  readonly spread: Spread;
  /** Load for a level force of 1 on a unit of weight, of area, of width across the load, or of the façade's load. */
  readonly perUnit: number;
  /** Of a façade: its load along s before the factor `perUnit` and any eccentricity [force/length] */
  readonly facade?: readonly LoadPiece[];
  /** Part of the live load that lies with the weight. */
  readonly liveShare: number;
  /** Eccentricity across the load that `load` and `centre` hold [length] */
  readonly offset: number;
};

export type SpreadNotes = {
  /** Load along s that a level's façade gives it, for `facade` [force/length] */
  readonly facade?: readonly LoadPiece[] | undefined;
  /** Part of the live load that lies with the weight, for `weight`; default 0 */
  readonly liveShare?: number;
};

/**
 * @param spread `weight` falls back on area where nothing on the level is weighed, `facade` on even where none reaches the level
 * @returns one inertia for each diaphragm of the level
 */
export function spreadOver(
  diaphragms: readonly DiaphragmModel[],
  frame: number,
  spread: Spread,
  { facade = [], liveShare = 0 }: SpreadNotes = {},
): Inertia[] {
  const weighed = diaphragms.some((d) => massWith(d.mass, liveShare).weight > 0);
  const idle = spread === 'facade' && facade.length === 0;
  const how = spread === 'weight' && !weighed ? 'area' : idle ? 'even' : spread;
  const shapes =
    how === 'facade'
      ? facadeShapes(
          diaphragms.map((d) => d.profiles[frame] as Profile),
          facade,
        )
      : diaphragms.map((d) => shapeOf(d, d.profiles[frame] as Profile, how, liveShare));
  const totals = shapes.map((shape) => resultant(shape.load));
  const whole = totals.reduce((sum, total) => sum + total.force, 0);
  return diaphragms.map((diaphragm, i) => {
    const shape = shapes[i] as Shape;
    const total = totals[i] as { force: number; moment: number };
    const factor = 1 / whole;
    return {
      diaphragm,
      frame,
      load: {
        pieces: shape.load.pieces.map((piece) => ({ ...piece, w: piece.w.map((w) => w * factor) })),
        points: shape.load.points.map((point) => ({ s: point.s, force: point.force * factor })),
      },
      along: shape.along.map((load) => ({ ...load, force: load.force * factor })),
      share: total.force * factor,
      centre: total.force > 0 ? total.moment / total.force : (diaphragm.profiles[frame] as Profile).from,
      spread: how,
      perUnit: factor,
      liveShare: how === 'weight' ? liveShare : 0,
      offset: 0,
      ...(how === 'facade' ? { facade: shape.load.pieces } : {}),
    };
  });
}

type Shape = { load: SpanLoad; along: AlongLoad[] };

function shapeOf(
  diaphragm: DiaphragmModel,
  profile: Profile,
  spread: Exclude<Spread, 'facade'>,
  liveShare: number,
): Shape {
  if (spread === 'even') {
    return { load: { pieces: [{ from: profile.from, to: profile.to, w: [1] }], points: [] }, along: [] };
  }
  const pieces: LoadPiece[] = [];
  for (const slab of profile.slabs) {
    let w0 = 0;
    let w1 = 0;
    for (const strip of slab.strips) {
      const q = spread === 'weight' ? strip.area + liveShare * strip.live : 1;
      w0 += q * (strip.upper0 - strip.lower0);
      w1 += q * (strip.upper1 - strip.lower1);
    }
    if (w0 === 0 && w1 === 0) continue;
    pieces.push({ from: slab.from, to: slab.to, w: [w0, (w1 - w0) / (slab.to - slab.from)] });
  }
  const along: AlongLoad[] = [];
  if (spread === 'weight') addLines(diaphragm, profile, pieces, along);
  const points: PointLoad[] = along.map(({ s, force }) => ({ s, force }));
  return { load: { pieces, points }, along };
}

/** Each part of the façade lies on the diaphragms behind it, in equal parts where there are several. */
function facadeShapes(profiles: readonly Profile[], facade: readonly LoadPiece[]): Shape[] {
  const reaches = ({ from, to, tolerance }: Profile, piece: LoadPiece): boolean =>
    from <= piece.from + tolerance && to >= piece.to - tolerance;
  const behind = facade.map((piece) => profiles.filter((profile) => reaches(profile, piece)).length);
  return profiles.map((profile) => ({
    load: {
      pieces: facade.flatMap((piece, i) =>
        reaches(profile, piece)
          ? [
              {
                from: within(piece.from, profile),
                to: within(piece.to, profile),
                w: piece.w.map((w) => w / (behind[i] as number)),
              },
            ]
          : [],
      ),
      points: [],
    },
    along: [],
  }));
}

/** A line across the load spreads over its length in `s`; one along it is a point load at its `s`. */
function addLines(diaphragm: DiaphragmModel, profile: Profile, pieces: LoadPiece[], along: AlongLoad[]): void {
  const { frame, tolerance } = profile;
  for (const line of diaphragm.diaphragm.weight?.lines ?? []) {
    for (let i = 0; i + 1 < line.along.length; i++) {
      const a = line.along[i] as Point;
      const b = line.along[i + 1] as Point;
      const force = line.perLength * Math.hypot(b[0] - a[0], b[1] - a[1]);
      if (force === 0) continue;
      const sa = dot(a, frame.s);
      const sb = dot(b, frame.s);
      const from = within(Math.min(sa, sb), profile);
      const to = within(Math.max(sa, sb), profile);
      if (to - from <= tolerance) along.push({ s: from, t0: dot(a, frame.t), t1: dot(b, frame.t), force });
      else pieces.push({ from, to, w: [force / (to - from)] });
    }
  }
}

/** A façade just outside the outline hangs on its edge. */
function within(s: number, profile: Profile): number {
  return Math.min(Math.max(s, profile.from), profile.to);
}

/**
 * The inertia moved across the load by `by`: a load that varies linearly over the projected width is added, of no resultant and of
 * moment force·by.
 *
 * @param by accidental eccentricity, positive towards +s [length]
 */
export function shiftedBy(inertia: Inertia, by: number): Inertia {
  if (by === 0) return inertia;
  const profile = inertia.diaphragm.profiles[inertia.frame] as Profile;
  const width = profile.to - profile.from;
  const slope = (12 * inertia.share * by) / (width * width * width);
  return {
    ...inertia,
    load: {
      pieces: [...inertia.load.pieces, { from: profile.from, to: profile.to, w: [(-slope * width) / 2, slope] }],
      points: inertia.load.points,
    },
    centre: inertia.centre + by,
    offset: inertia.offset + by,
  };
}
