/** Weights per area as a working takes them from the file: of the floor itself, and of its live load. */
import type { Inertia } from '../diaphragms/inertia.js';
import type { Strip } from '../geometry/profile.js';
import { liveShare } from '../loads/basis-of.js';
import { DEFAULT_PSI_E } from '../loads/en1998/live-share.js';
import { basisPlace } from './basis-path.js';
import { fromFile, fromFileOr, type Context } from './context.js';
import { areaWeight } from './floor-parts.js';
import type { Value } from './steps.js';

export type AreaWeight = { readonly of: 'area' | 'live'; readonly q: number };

/** What of a strip's weight a level's force lies on. */
export function weightsOf({ area, live }: Strip, part: number): AreaWeight[] {
  return [
    ...(area === 0 ? [] : [{ of: 'area' as const, q: area }]),
    ...(live === 0 || part === 0 ? [] : [{ of: 'live' as const, q: live }]),
  ];
}

/** Where a level's force lies by weight; without live load where its part is left out. */
export type Weighed = Pick<Inertia, 'diaphragm'> & { readonly liveShare?: number };

/**
 * The diaphragm's own weight, or that of the zone which has this one; live load with the part of it that counts.
 *
 * @returns factors
 */
export function weightFactors(context: Context, weighed: Weighed, { of, q }: AreaWeight, symbol: string): Value[] {
  if (of === 'area') return [areaWeight(context, weighed.diaphragm, q, symbol)];
  const { diaphragm, path } = weighed.diaphragm;
  const unit = `${context.units.force}/${context.units.length}²`;
  const zone = (diaphragm.weight?.zones ?? []).findIndex(({ live }) => live === q);
  const weight =
    q === diaphragm.weight?.live || zone < 0
      ? fromFileOr(context, symbol, `${path}.weight.live`, 0, unit)
      : fromFile(context, symbol, `${path}.weight.zones[${zone}].live`, unit);
  return [livePart(context, weighed.liveShare ?? 0), weight];
}

function livePart(context: Context, part: number): Value {
  const { building } = context;
  const loadCase = building.loadCases.find((each) => liveShare(building, each) === part);
  const place = loadCase === undefined ? undefined : basisPlace(building, loadCase);
  if (place === undefined) throw new Error(`no basis of design takes ${part} of the live load`);
  return fromFileOr(context, 'ψ_E', `${place.path}.seismic.psiE`, DEFAULT_PSI_E, '1');
}
