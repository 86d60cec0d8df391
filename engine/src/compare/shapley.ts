/**
 * Shares of several causes in one effect: their Shapley values, which add up to the whole effect and give a cause without effect nothing.
 *
 * Source: L. S. Shapley, "A Value for n-Person Games", Contributions to the Theory of Games II, Princeton 1953 (formula from memory).
 */

/** Effects of a set of causes, given as bits; one value for each row. */
export type EffectOf = (causes: bigint) => Float64Array;

export type Shares = {
  /** By cause: its share in each row. */
  readonly shares: readonly Float64Array[];
  /** Standard error of each share; absent where the shares are exact. */
  readonly errors?: readonly Float64Array[];
  readonly method: Method;
};

export type Method =
  | { readonly kind: 'exact' }
  | {
      readonly kind: 'sampled';
      /** Antithetic pairs of orders. */
      readonly pairs: number;
      readonly seed: number;
    };

/** Up to so many causes all their sets are looked at. */
export const EXACT_UP_TO = 10;

/**
 * @param count  number of causes
 * @param rows   number of values that the effect has
 * @param pairs  antithetic pairs of orders that are drawn where there are too many causes for all sets
 */
export function shapley(count: number, rows: number, effect: EffectOf, pairs = 32, seed = 1): Shares {
  return count <= EXACT_UP_TO ? exact(count, rows, effect) : sampled(count, rows, effect, pairs, seed);
}

/** φ_i = Σ_S |S|!·(n−|S|−1)!/n! · (v(S ∪ i) − v(S)), as one sum over all sets. */
function exact(count: number, rows: number, effect: EffectOf): Shares {
  const shares = Array.from({ length: count }, () => new Float64Array(rows));
  const weight = (size: number): number => {
    // |S|!·(n−|S|−1)!/n! = 1 / (n · C(n−1, |S|))
    let combinations = 1;
    for (let i = 0; i < size; i++) combinations = (combinations * (count - 1 - i)) / (i + 1);
    return 1 / (count * combinations);
  };
  for (const set of bySize(count)) {
    const values = effect(set);
    const size = sizeOf(set);
    for (let cause = 0; cause < count; cause++) {
      const has = (set >> BigInt(cause)) & 1n;
      const factor = has === 1n ? weight(size - 1) : -weight(size);
      const share = shares[cause] as Float64Array;
      for (let row = 0; row < rows; row++) share[row] = (share[row] as number) + factor * (values[row] as number);
    }
  }
  return { shares, method: { kind: 'exact' } };
}

/** All sets of causes, the small ones first. */
export function bySize(count: number): bigint[] {
  const sets = Array.from({ length: 2 ** count }, (_, set) => BigInt(set));
  return sets.sort((a, b) => sizeOf(a) - sizeOf(b) || (a < b ? -1 : 1));
}

function sizeOf(set: bigint): number {
  let size = 0;
  for (let rest = set; rest > 0n; rest >>= 1n) size += Number(rest & 1n);
  return size;
}

/** What each cause adds when it comes in its turn, averaged over orders drawn in pairs: one and the same read backwards. */
function sampled(count: number, rows: number, effect: EffectOf, pairs: number, seed: number): Shares {
  const random = generator(seed);
  const zeros = () => Array.from({ length: count }, () => new Float64Array(rows));
  const [shares, squares, pair] = [zeros(), zeros(), zeros()];
  for (let n = 0; n < pairs; n++) {
    const order = shuffled(count, random);
    for (const share of pair) share.fill(0);
    for (const each of [order, [...order].reverse()]) {
      let set = 0n;
      let before = effect(set);
      for (const cause of each) {
        set |= 1n << BigInt(cause);
        const after = effect(set);
        const share = pair[cause] as Float64Array;
        for (let row = 0; row < rows; row++) {
          share[row] = (share[row] as number) + ((after[row] as number) - (before[row] as number)) / 2;
        }
        before = after;
      }
    }
    for (let cause = 0; cause < count; cause++) {
      const [mean, square, now] = [shares[cause], squares[cause], pair[cause]] as [
        Float64Array,
        Float64Array,
        Float64Array,
      ];
      for (let row = 0; row < rows; row++) {
        // Welford's running mean and sum of squares.
        const away = (now[row] as number) - (mean[row] as number);
        mean[row] = (mean[row] as number) + away / (n + 1);
        square[row] = (square[row] as number) + away * ((now[row] as number) - (mean[row] as number));
      }
    }
  }
  for (const square of squares) {
    for (let row = 0; row < rows; row++) square[row] = Math.sqrt((square[row] as number) / (pairs * (pairs - 1)));
  }
  return { shares, errors: squares, method: { kind: 'sampled', pairs, seed } };
}

function shuffled(count: number, random: () => number): number[] {
  const order = Array.from({ length: count }, (_, i) => i);
  for (let i = count - 1; i > 0; i--) {
    const j = Math.floor(random() * (i + 1));
    [order[i], order[j]] = [order[j] as number, order[i] as number];
  }
  return order;
}

/** A small generator of evenly spread numbers in [0, 1) with a stated seed (mulberry32). */
function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}
