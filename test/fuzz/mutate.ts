/** Damage to a building file: to a value, a key, a list, an id, a ring of points, or to the text itself. */

export type Random = () => number;

/** Numbers from 0 to 1, the same for the same seed (mulberry32). */
export function randomFrom(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
}

type Json = null | boolean | number | string | Json[] | { [key: string]: Json };
type Place = { readonly of: Json[] | { [key: string]: Json }; readonly key: string | number };

const ANYTHING: readonly Json[] = [
  null,
  true,
  '',
  'x',
  '0',
  0,
  -1,
  1e308,
  -1e308,
  5e-324,
  1e-12,
  2 ** 53,
  [],
  {},
  [[]],
  [0, 0],
  { id: 'x' },
  '__proto__',
  'constructor',
  '\u0000',
  'Ω'.repeat(300),
];
const FACTORS = [-1, 0, 1e-9, 1e9, 0.5, 2, 1 + 1e-12, 1 + 1e-7, 1e-300, 1e300];

/** The text of a building with one to three mutations. */
export function mutated(text: string, random: Random): string {
  const below = (n: number): number => Math.floor(random() * n);
  const file = JSON.parse(text) as Json;
  for (let times = 1 + below(3); times > 0; times--) VALUE_MUTATIONS[below(VALUE_MUTATIONS.length)]?.(file, below);
  const printed = JSON.stringify(file);
  return below(8) === 0 ? (TEXT_MUTATIONS[below(TEXT_MUTATIONS.length)] as TextMutation)(printed, below) : printed;
}

type Below = (n: number) => number;
type ValueMutation = (file: Json, below: Below) => void;
type TextMutation = (text: string, below: Below) => string;

const VALUE_MUTATIONS: readonly ValueMutation[] = [
  // Another type
  (file, below) => write(one(places(file), below), ANYTHING[below(ANYTHING.length)] as Json),
  // A number out of its range, or next to its neighbour
  (file, below) => {
    const at = one(
      places(file, (value) => typeof value === 'number'),
      below,
    );
    if (at !== undefined) write(at, (read(at) as number) * (FACTORS[below(FACTORS.length)] as number));
  },
  // A number of elsewhere in the file
  (file, below) => {
    const numbers = places(file, (value) => typeof value === 'number');
    const [from, to] = [one(numbers, below), one(numbers, below)];
    if (from !== undefined && to !== undefined) write(to, read(from));
  },
  // An id that is another's, or none
  (file, below) => {
    const texts = places(file, (value) => typeof value === 'string');
    const [from, to] = [one(texts, below), one(texts, below)];
    if (from !== undefined && to !== undefined) write(to, below(3) === 0 ? `${read(from) as string}/x` : read(from));
  },
  // A key that is missing, unknown, or moved
  (file, below) => {
    const at = one(
      places(file, (_, key) => typeof key === 'string'),
      below,
    );
    if (at === undefined || Array.isArray(at.of)) return;
    const value = at.of[at.key] as Json;
    Reflect.deleteProperty(at.of, at.key);
    if (below(2) === 0) at.of[`${at.key}s`] = value;
  },
  // An entry of a list twice, gone, or the list turned round
  (file, below) => {
    const lists = places(file, Array.isArray).map((at) => read(at) as Json[]);
    const list = lists[below(lists.length)];
    if (list === undefined || list.length === 0) return;
    const i = below(list.length);
    const way = below(4);
    if (way === 0) list.splice(i, 1);
    else if (way === 1) list.splice(below(list.length + 1), 0, structuredClone(list[i] as Json));
    else if (way === 2) list.reverse();
    else list.push(...list.splice(0, i));
  },
  // A ring or a line of points folded, pinched or flattened
  (file, below) => {
    const rings = places(file, isRing).map((at) => read(at) as [number, number][]);
    const ring = rings[below(rings.length)];
    if (ring === undefined) return;
    const [i, j] = [below(ring.length), below(ring.length)];
    const [p, q] = [ring[i] as [number, number], ring[j] as [number, number]];
    const way = below(4);
    if (way === 0) [ring[i], ring[j]] = [q, p];
    else if (way === 1) ring[i] = [...q];
    else if (way === 2) ring[i] = [p[0] + (q[0] - p[0]) * 0.5, p[1] + (q[1] - p[1]) * 0.5 + 1e-9];
    else for (const point of ring) point[below(2)] = p[0];
  },
  // Much of something
  (file, below) => {
    const lists = places(file, Array.isArray).map((at) => read(at) as Json[]);
    const list = lists[below(lists.length)];
    const entry = list?.[below(list.length)];
    if (list === undefined || entry === undefined) return;
    const size = JSON.stringify(entry).length;
    for (let n = Math.min(60, Math.floor(30_000 / size)); n > 0; n--) list.push(structuredClone(entry));
  },
];

const TEXT_MUTATIONS: readonly TextMutation[] = [
  (text, below) => text.slice(0, below(text.length)),
  (text, below) => {
    const at = below(text.length);
    return text.slice(0, at) + text.slice(at + 1 + below(4));
  },
  (text, below) => {
    const at = below(text.length);
    return text.slice(0, at) + '{}[],:"\\-e\u0000\ud800٣'.charAt(below(13)) + text.slice(at);
  },
  (text, below) => {
    const [a, b] = [below(text.length), below(200)];
    return text.slice(0, a) + text.slice(a, a + b) + text.slice(a);
  },
  (text) => `\ufeff${text}`,
  (text, below) => '['.repeat(below(100_000)) + text,
  (text, below) => text.replaceAll('1', String(below(10))),
  (text) => text.replace('"levels":', '"levels":[],"levels":'),
];

function* walk(of: Json): Generator<Place> {
  if (typeof of !== 'object' || of === null) return;
  const keys = Array.isArray(of) ? of.map((_, i) => i) : Object.keys(of);
  for (const key of keys) {
    yield { of, key };
    yield* walk(read({ of, key }));
  }
}

function places(file: Json, fits: (value: Json, key: string | number) => boolean = () => true): Place[] {
  return [...walk(file)].filter((place) => fits(read(place), place.key));
}

function one(all: readonly Place[], below: Below): Place | undefined {
  return all[below(all.length)];
}

function read({ of, key }: Place): Json {
  return (of as Record<string | number, Json>)[key] as Json;
}

function write(place: Place | undefined, value: Json): void {
  if (place === undefined) return;
  Object.defineProperty(place.of, place.key, {
    value: structuredClone(value),
    writable: true,
    enumerable: true,
    configurable: true,
  });
}

function isRing(value: Json): boolean {
  return (
    Array.isArray(value) &&
    value.length > 1 &&
    value.every((point) => Array.isArray(point) && point.length === 2 && point.every((x) => typeof x === 'number'))
  );
}
