/** Paths into the building file, as faults and workings write them: `levels[1].diaphragms[0].outline[2][1]`. */

/** @returns what stands there; undefined where nothing does */
export function atPath(document: unknown, path: string): unknown {
  let at: unknown = document;
  for (const [, key, index] of path.matchAll(/([^.[\]]+)|\[(\d+)\]/g)) {
    if (typeof at !== 'object' || at === null) return undefined;
    at = (at as Readonly<Record<string, unknown>>)[key ?? index ?? ''];
  }
  return at;
}
