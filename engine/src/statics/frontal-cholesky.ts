/**
 * Cholesky's factorisation of a sparse symmetric positive definite stiffness, front by front: the plan is halved again and again, each
 * half eliminates the nodes that nothing outside it touches and hands what is left of its matrix to the whole (nested dissection).
 * A node has two unknowns, its displacements along x and along y; unknowns 2·n and 2·n + 1.
 */

/** A part of the stiffness on some nodes: row-major, symmetric, two rows a node. */
export type ElementStiffness = {
  readonly nodes: Int32Array;
  readonly matrix: Float64Array;
  /** Where it lies on plan, by which the plan is halved [length] */
  readonly x: number;
  readonly y: number;
};

export type Factor = { readonly unknowns: number; readonly fronts: readonly Front[] };

type Front = {
  /** Unknowns of the front: the eliminated ones first, then those left to the whole. */
  readonly unknowns: Int32Array;
  readonly eliminated: number;
  /** Rows of L for all unknowns of the front, `eliminated` numbers a row. */
  readonly rows: Float64Array;
};

/** What a part of the plan leaves to the whole. */
type Rest = {
  readonly nodes: Int32Array;
  /** How many elements of the part touch each node. */
  readonly touched: Int32Array;
  /** Row-major, lower triangle. */
  readonly matrix: Float64Array;
};

/** Parts of the plan with at most so many elements are eliminated at once. */
const LEAF = 4;

/**
 * @returns undefined where a pivot is not positive (the stiffness is singular)
 * Source: A. George, Nested dissection of a regular finite element mesh, SIAM J. Numer. Anal. 10 (1973); I. S. Duff and J. K. Reid,
 * The multifrontal solution of indefinite sparse symmetric linear equations, ACM TOMS 9 (1983).
 */
export function factorise(elements: readonly ElementStiffness[], nodes: number): Factor | undefined {
  const degree = new Int32Array(nodes);
  for (const element of elements) for (const node of element.nodes) degree[node] = (degree[node] as number) + 1;
  const fronts: Front[] = [];
  const slot = new Int32Array(nodes).fill(-1);
  const condense = (part: readonly ElementStiffness[]): Rest | undefined => {
    if (part.length <= LEAF) return eliminate(fronts, degree, slot, part, []);
    const [first, second] = halves(part);
    const a = condense(first);
    const b = a === undefined ? undefined : condense(second);
    return a === undefined || b === undefined ? undefined : eliminate(fronts, degree, slot, [], [a, b]);
  };
  return condense(elements) === undefined ? undefined : { unknowns: 2 * nodes, fronts };
}

/** Halves across the longer direction, cut where the places of neighbours differ, as near to the middle as can be. */
function halves(
  part: readonly ElementStiffness[],
): readonly [readonly ElementStiffness[], readonly ElementStiffness[]] {
  let x0 = Infinity;
  let x1 = -Infinity;
  let y0 = Infinity;
  let y1 = -Infinity;
  for (const { x, y } of part) {
    x0 = Math.min(x0, x);
    x1 = Math.max(x1, x);
    y0 = Math.min(y0, y);
    y1 = Math.max(y1, y);
  }
  const alongX = x1 - x0 >= y1 - y0;
  const at = (element: ElementStiffness): number => (alongX ? element.x : element.y);
  const sorted = [...part].sort((a, b) => at(a) - at(b));
  const middle = sorted.length >> 1;
  const tolerance = 1e-9 * Math.max(x1 - x0, y1 - y0);
  for (let d = 0; d < middle; d++) {
    for (const cut of [middle - d, middle + d]) {
      const before = sorted[cut - 1];
      const after = sorted[cut];
      if (before === undefined || after === undefined || at(after) - at(before) <= tolerance) continue;
      return [sorted.slice(0, cut), sorted.slice(cut)];
    }
  }
  return [sorted.slice(0, middle), sorted.slice(middle)];
}

/** Adds elements and rests of parts to one dense front, eliminates the nodes that only they touch, returns what is left. */
function eliminate(
  fronts: Front[],
  degree: Int32Array,
  slot: Int32Array,
  elements: readonly ElementStiffness[],
  rests: readonly Rest[],
): Rest | undefined {
  const nodes: number[] = [];
  const touched: number[] = [];
  const touch = (node: number, times: number): void => {
    const known = slot[node] as number;
    if (known >= 0) touched[known] = (touched[known] as number) + times;
    else {
      slot[node] = nodes.length;
      nodes.push(node);
      touched.push(times);
    }
  };
  for (const element of elements) for (const node of element.nodes) touch(node, 1);
  for (const rest of rests) rest.nodes.forEach((node, i) => touch(node, rest.touched[i] as number));

  const order: number[] = [];
  for (let i = 0; i < nodes.length; i++) if (touched[i] === degree[nodes[i] as number]) order.push(i);
  const complete = order.length;
  for (let i = 0; i < nodes.length; i++) if (touched[i] !== degree[nodes[i] as number]) order.push(i);
  order.forEach((i, position) => (slot[nodes[i] as number] = position));

  const size = 2 * nodes.length;
  const front = new Float64Array(size * size);
  for (const element of elements) addBlocks(front, size, slot, element.nodes, element.matrix);
  for (const rest of rests) addBlocks(front, size, slot, rest.nodes, rest.matrix);
  for (const node of nodes) slot[node] = -1;

  const eliminated = 2 * complete;
  if (!factorFront(front, size, eliminated)) return undefined;
  const unknowns = new Int32Array(size);
  order.forEach((i, position) => {
    unknowns[2 * position] = 2 * (nodes[i] as number);
    unknowns[2 * position + 1] = 2 * (nodes[i] as number) + 1;
  });
  const rows = new Float64Array(size * eliminated);
  for (let i = 0; i < size; i++) rows.set(front.subarray(i * size, i * size + eliminated), i * eliminated);
  fronts.push({ unknowns, eliminated, rows });

  const left = size - eliminated;
  const matrix = new Float64Array(left * left);
  for (let i = 0; i < left; i++) {
    const start = (i + eliminated) * size + eliminated;
    matrix.set(front.subarray(start, start + i + 1), i * left);
  }
  const rest = order.slice(complete);
  return {
    nodes: Int32Array.from(rest, (i) => nodes[i] as number),
    touched: Int32Array.from(rest, (i) => touched[i] as number),
    matrix,
  };
}

/** Adds the lower triangle of a matrix; where two nodes change their order, what lies above the diagonal is taken from below it. */
function addBlocks(front: Float64Array, size: number, slot: Int32Array, nodes: Int32Array, matrix: Float64Array): void {
  const width = 2 * nodes.length;
  for (let a = 0; a < nodes.length; a++) {
    const la = slot[nodes[a] as number] as number;
    for (let b = 0; b <= a; b++) {
      const lb = slot[nodes[b] as number] as number;
      const from = 2 * a * width + 2 * b;
      const m00 = matrix[from] as number;
      const m01 = matrix[from + 1] as number;
      const m10 = matrix[from + width] as number;
      const m11 = matrix[from + width + 1] as number;
      const upright = la >= lb;
      const into = upright ? 2 * la * size + 2 * lb : 2 * lb * size + 2 * la;
      front[into] = (front[into] as number) + m00;
      if (la !== lb) front[into + 1] = (front[into + 1] as number) + (upright ? m01 : m10);
      front[into + size] = (front[into + size] as number) + (upright ? m10 : m01);
      front[into + size + 1] = (front[into + size + 1] as number) + m11;
    }
  }
}

/** L of the first `eliminated` columns in place, and below them the matrix that is left. Rows in fours, so that each load serves four sums. */
function factorFront(a: Float64Array, size: number, eliminated: number): boolean {
  for (let i = 0; i < size; i += 4) {
    const rows = Math.min(4, size - i);
    let square = i;
    if (rows === 4) {
      const r0 = i * size;
      const r1 = r0 + size;
      const r2 = r1 + size;
      const r3 = r2 + size;
      for (let j = 0; j < i; j++) {
        const rj = j * size;
        const last = j < eliminated ? j : eliminated;
        let s0 = a[r0 + j] as number;
        let s1 = a[r1 + j] as number;
        let s2 = a[r2 + j] as number;
        let s3 = a[r3 + j] as number;
        for (let k = 0; k < last; k++) {
          const v = a[rj + k] as number;
          s0 -= (a[r0 + k] as number) * v;
          s1 -= (a[r1 + k] as number) * v;
          s2 -= (a[r2 + k] as number) * v;
          s3 -= (a[r3 + k] as number) * v;
        }
        if (j < eliminated) {
          const inverse = 1 / (a[rj + j] as number);
          s0 *= inverse;
          s1 *= inverse;
          s2 *= inverse;
          s3 *= inverse;
        }
        a[r0 + j] = s0;
        a[r1 + j] = s1;
        a[r2 + j] = s2;
        a[r3 + j] = s3;
      }
    } else square = 0;
    for (let r = i; r < i + rows; r++) {
      for (let j = square; j <= r; j++) {
        const last = j < eliminated ? j : eliminated;
        let sum = a[r * size + j] as number;
        for (let k = 0; k < last; k++) sum -= (a[r * size + k] as number) * (a[j * size + k] as number);
        if (j < eliminated) {
          if (j < r) sum /= a[j * size + j] as number;
          else if (sum > 0) sum = Math.sqrt(sum);
          else return false;
        }
        a[r * size + j] = sum;
      }
    }
  }
  return true;
}

/** Solves K·u = f. @returns u, a new array */
export function solve({ unknowns, fronts }: Factor, f: Float64Array): Float64Array {
  const u = Float64Array.from(f);
  if (u.length !== unknowns) throw new RangeError(`a load of ${u.length} numbers on ${unknowns} unknowns`);
  const own = new Float64Array(fronts.reduce((most, front) => Math.max(most, front.eliminated), 0));
  for (const { unknowns: of, eliminated, rows } of fronts) {
    for (let i = 0; i < eliminated; i++) {
      const row = i * eliminated;
      let sum = u[of[i] as number] as number;
      for (let k = 0; k < i; k++) sum -= (rows[row + k] as number) * (own[k] as number);
      own[i] = sum / (rows[row + i] as number);
      u[of[i] as number] = own[i] as number;
    }
    for (let i = eliminated; i < of.length; i++) {
      const row = i * eliminated;
      let sum = 0;
      for (let k = 0; k < eliminated; k++) sum += (rows[row + k] as number) * (own[k] as number);
      u[of[i] as number] = (u[of[i] as number] as number) - sum;
    }
  }
  for (let f = fronts.length - 1; f >= 0; f--) {
    const { unknowns: of, eliminated, rows } = fronts[f] as Front;
    for (let k = 0; k < eliminated; k++) own[k] = u[of[k] as number] as number;
    for (let i = of.length - 1; i >= eliminated; i--) {
      const row = i * eliminated;
      const value = u[of[i] as number] as number;
      for (let k = 0; k < eliminated; k++) own[k] = (own[k] as number) - (rows[row + k] as number) * value;
    }
    for (let i = eliminated - 1; i >= 0; i--) {
      const row = i * eliminated;
      const value = (own[i] as number) / (rows[row + i] as number);
      own[i] = value;
      for (let k = 0; k < i; k++) own[k] = (own[k] as number) - (rows[row + k] as number) * value;
    }
    for (let k = 0; k < eliminated; k++) u[of[k] as number] = own[k] as number;
  }
  return u;
}

/** K·u by its elements. */
export function times(elements: readonly ElementStiffness[], u: Float64Array): Float64Array {
  const out = new Float64Array(u.length);
  for (const { nodes, matrix } of elements) {
    const width = 2 * nodes.length;
    for (let a = 0; a < width; a++) {
      let sum = 0;
      const row = a * width;
      for (let b = 0; b < nodes.length; b++) {
        const from = 2 * (nodes[b] as number);
        sum += (matrix[row + 2 * b] as number) * (u[from] as number);
        sum += (matrix[row + 2 * b + 1] as number) * (u[from + 1] as number);
      }
      const to = 2 * (nodes[a >> 1] as number) + (a & 1);
      out[to] = (out[to] as number) + sum;
    }
  }
  return out;
}
