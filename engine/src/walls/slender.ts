/** How slender a wood shear wall may be, and what its capacity loses when it is. Source: SDPWS-2015 4.3.4, SDPWS-2021 4.3.3. */
import type { Edition } from './capacity.js';

export type Sheathing = 'panels-blocked' | 'panels-unblocked' | 'plaster' | 'gypsum';

/** How a line's force goes to its piers: by equal deflection, or in proportion to strength with the reduction that permits it. */
export type Sharing = 'equal-deflection' | 'strength';

export type Slenderness = {
  /** h/b */
  readonly ratio: number;
  readonly limit: number;
  readonly permitted: boolean;
  /** The nominal unit shear is multiplied by it; 0 beyond the limit. */
  readonly factor: number;
  readonly clause: string;
};

/**
 * @param height h, of the pier [length]
 * @param length b, of the pier [same length]
 * @throws RangeError when height or length is not positive
 * Source: SDPWS-2015 Table 4.3.4, 4.3.4.2, 4.3.3.4.1 exception 1; SDPWS-2021 Table 4.3.3, 4.3.3.2, 4.3.5.5.1 exception 1. Limits and formulas from
 * memory, not checked against the documents. The two factors are never multiplied together.
 */
export function slenderness(
  height: number,
  length: number,
  sheathing: Sheathing,
  sharing: Sharing,
  edition: Edition,
): Slenderness {
  if (!(height > 0 && length > 0)) throw new RangeError(`a pier ${height} high and ${length} long`);
  const ratio = height / length;
  const limit = aspectRatioLimit(sheathing);
  const clause = clauses[edition];
  if (ratio > limit * (1 + 1e-9)) return { ratio, limit, permitted: false, factor: 0, clause: clause.limit };
  if (ratio <= 2) return { ratio, limit, permitted: true, factor: 1, clause: clause.limit };
  return sharing === 'strength'
    ? { ratio, limit, permitted: true, factor: 2 / ratio, clause: clause.strength } // 2b/h
    : { ratio, limit, permitted: true, factor: 1.25 - 0.125 * ratio, clause: clause.factor };
}

const clauses: Readonly<Record<Edition, { limit: string; factor: string; strength: string }>> = {
  '2015': {
    limit: 'SDPWS-2015 Table 4.3.4',
    factor: 'SDPWS-2015 4.3.4.2',
    strength: 'SDPWS-2015 4.3.3.4.1 exception 1',
  },
  '2021': {
    limit: 'SDPWS-2021 Table 4.3.3',
    factor: 'SDPWS-2021 4.3.3.2',
    strength: 'SDPWS-2021 4.3.5.5.1 exception 1',
  },
};

/** Greatest h/b. Source: SDPWS-2015 Table 4.3.4; from memory, not checked against the document. */
export function aspectRatioLimit(sheathing: Sheathing): number {
  return sheathing === 'panels-blocked' ? 3.5 : 2;
}
