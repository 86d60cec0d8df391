/** Changes of a building file in the editor: plain values at plain paths. */

export type Path = readonly (string | number)[];

/** The document with one value set; `undefined` takes the key away. */
export function setAt(document: unknown, path: Path, value: unknown): unknown {
  const [head, ...rest] = path;
  if (head === undefined) return value;
  if (Array.isArray(document)) {
    const copy = [...(document as unknown[])];
    copy[head as number] = setAt(copy[head as number], rest, value);
    return copy;
  }
  const copy: Record<string, unknown> = { ...(document as Record<string, unknown> | undefined) };
  const next = setAt(copy[head], rest, value);
  if (next === undefined) Reflect.deleteProperty(copy, head);
  else copy[head] = next;
  return copy;
}

export function getAt(document: unknown, path: Path): unknown {
  return path.reduce<unknown>(
    (value, key) =>
      value === null || typeof value !== 'object' ? undefined : (value as Record<string | number, unknown>)[key],
    document,
  );
}

/** The path as faults write it: `levels[1].elevation`. */
export function jsonPath(path: Path): string {
  return path.reduce<string>(
    (text, key) => (typeof key === 'number' ? `${text}[${key}]` : text === '' ? key : `${text}.${key}`),
    '',
  );
}

/** What was typed as the file holds it: a number where it is one, else the text, which the reader will refuse with a fault at its place. */
export function typedNumber(text: string): unknown {
  const clean = text.trim().replaceAll('\u2009', '').replaceAll('\u2212', '-');
  if (clean === '') return undefined;
  const comma = /^-?\d+,\d+$/.test(clean) ? clean.replace(',', '.') : clean;
  const value = Number(comma);
  return Number.isFinite(value) ? value : clean;
}

/** Cells of a block pasted from a spreadsheet. */
export function pastedCells(text: string): string[][] {
  return text
    .replace(/\r?\n$/, '')
    .split(/\r?\n/)
    .map((row) => row.split('\t'));
}
