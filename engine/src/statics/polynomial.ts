/** Polynomials as coefficients in ascending powers: `c[0] + c[1]·x + c[2]·x² + …`. */

export type Polynomial = readonly number[];

export function valueAt(c: Polynomial, x: number): number {
  let sum = 0;
  for (let i = c.length - 1; i >= 0; i--) sum = sum * x + (c[i] as number);
  return sum;
}

/** The integral that is `start` at x = 0. */
export function integral(c: Polynomial, start: number): number[] {
  const out = [start];
  for (let i = 0; i < c.length; i++) out.push((c[i] as number) / (i + 1));
  return out;
}

export function sum(a: Polynomial, b: Polynomial): number[] {
  const out: number[] = [];
  for (let i = 0; i < Math.max(a.length, b.length); i++) out.push((a[i] ?? 0) + (b[i] ?? 0));
  return out;
}

export function scaled(a: Polynomial, factor: number): number[] {
  return a.map((value) => value * factor);
}

export type Extreme = { readonly x: number; readonly value: number };

/**
 * The largest absolute value of `p/q` on [0, length], from the ends and the closed-form roots of its derivative.
 *
 * @param p at most cubic
 * @param q at most linear, positive inside the interval; where both vanish at an end the limit is taken
 */
export function largestRatio(p: Polynomial, q: Polynomial, length: number): Extreme {
  let best = ratioAt(p, q, 0, length);
  const consider = (x: number): void => {
    const candidate = ratioAt(p, q, x, length);
    if (Math.abs(candidate.value) > Math.abs(best.value)) best = candidate;
  };
  consider(length);
  // (p/q)' = 0  ⇔  p'q − pq' = 0
  const [p0 = 0, p1 = 0, p2 = 0, p3 = 0] = p;
  const [q0 = 0, q1 = 0] = q;
  const numerator =
    q1 === 0 ? [p1, 2 * p2, 3 * p3] : [p1 * q0 - p0 * q1, 2 * p2 * q0, 3 * p3 * q0 + p2 * q1, 2 * p3 * q1];
  for (const x of realRoots(numerator, length)) consider(x);
  return best;
}

/** The largest absolute value of `p` on [0, length]. */
export function largest(p: Polynomial, length: number): Extreme {
  return largestRatio(p, UNIT, length);
}

const UNIT: Polynomial = [1];

function ratioAt(p: Polynomial, q: Polynomial, x: number, length: number): Extreme {
  const below = valueAt(q, x);
  const above = valueAt(p, x);
  const scale = Math.max(Math.abs(valueAt(q, 0)), Math.abs(valueAt(q, length)));
  if (Math.abs(below) > 1e-9 * scale) return { x, value: above / below };
  // A tip without depth: p and q both vanish there, the limit is the ratio of their slopes.
  const slope = q[1] ?? 0;
  if (slope === 0) return { x, value: 0 };
  const rise = (p[1] ?? 0) + 2 * (p[2] ?? 0) * x + 3 * (p[3] ?? 0) * x * x;
  return { x, value: rise / slope };
}

/**
 * Real roots strictly inside (0, length) of a polynomial of at most third degree, in closed form
 * (quadratic formula in its stable form; trigonometric and Cardano's forms for the cubic, each root polished once by Newton's step).
 */
export function realRoots(c: Polynomial, length: number): number[] {
  // In x/length the coefficients are comparable, so that a vanishing leading one can be told.
  const n: [number, number, number, number] = [
    c[0] ?? 0,
    (c[1] ?? 0) * length,
    (c[2] ?? 0) * length * length,
    (c[3] ?? 0) * length * length * length,
  ];
  const scale = Math.max(Math.abs(n[0]), Math.abs(n[1]), Math.abs(n[2]), Math.abs(n[3]));
  if (scale === 0) return NO_ROOTS;
  const negligible = 1e-12 * scale;
  const roots =
    Math.abs(n[3]) > negligible
      ? cubicRoots(n)
      : Math.abs(n[2]) > negligible
        ? quadraticRoots(n[2], n[1], n[0])
        : Math.abs(n[1]) > negligible
          ? [-n[0] / n[1]]
          : NO_ROOTS;
  const out: number[] = [];
  for (const root of roots) {
    const slope = n[1] + root * (2 * n[2] + root * 3 * n[3]);
    const polished = slope === 0 ? root : root - valueAt(n, root) / slope;
    const x = Number.isFinite(polished) && Math.abs(polished - root) < 1e-3 ? polished : root;
    if (x > 0 && x < 1) out.push(x * length);
  }
  return out;
}

const NO_ROOTS: number[] = [];

function quadraticRoots(a: number, b: number, c: number): number[] {
  const discriminant = b * b - 4 * a * c;
  if (discriminant < 0) return NO_ROOTS;
  const q = -(b + Math.sign(b || 1) * Math.sqrt(discriminant)) / 2;
  return q === 0 ? [0] : [q / a, c / q];
}

function cubicRoots([d, c, b, a]: readonly [number, number, number, number]): number[] {
  const shift = b / (3 * a);
  const p = c / a - 3 * shift * shift;
  const q = 2 * shift * shift * shift - (shift * c) / a + d / a;
  const discriminant = (q * q) / 4 + (p * p * p) / 27;
  if (discriminant > 0) {
    const root = Math.sqrt(discriminant);
    return [Math.cbrt(-q / 2 + root) + Math.cbrt(-q / 2 - root) - shift];
  }
  const radius = 2 * Math.sqrt(-p / 3);
  if (radius === 0) return [-shift];
  const angle = Math.acos(Math.max(-1, Math.min(1, (3 * q) / (p * radius)))) / 3;
  return [0, 1, 2].map((k) => radius * Math.cos(angle - (2 * Math.PI * k) / 3) - shift);
}
