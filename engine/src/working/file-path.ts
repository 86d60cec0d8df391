/** Paths into the building file, as faults and workings write them: `levels[1].diaphragms[0].outline[2][1]`. */

const found = new WeakMap<object, Map<string, unknown>>();

/** @returns what stands there; undefined where nothing does */
export function atPath(document: object, path: string): unknown {
  let known = found.get(document);
  if (known === undefined) found.set(document, (known = new Map<string, unknown>()));
  if (!known.has(path)) known.set(path, follow(document, path));
  return known.get(path);
}

function follow(document: object, path: string): unknown {
  let at: unknown = document;
  for (const [, key, index] of path.matchAll(/([^.[\]]+)|\[(\d+)\]/g)) {
    if (typeof at !== 'object' || at === null) return undefined;
    at = (at as Readonly<Record<string, unknown>>)[key ?? index ?? ''];
  }
  return at;
}
