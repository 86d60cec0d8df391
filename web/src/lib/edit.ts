/** Changes of a building file in the editor: plain values at plain paths. */
import type { Fault } from '@groundward/engine/building/fault';

export type Path = readonly (string | number)[];

/** A new value at a path, or what makes it from the value that is there; `undefined` takes the key away. */
export type Change = { readonly path: Path; readonly value: unknown };

/** The document after the changes, one after the other. */
export function changed(document: unknown, changes: readonly Change[]): unknown {
  return changes.reduce<unknown>((now, { path, value }) => {
    const next: unknown = typeof value === 'function' ? (value as (old: unknown) => unknown)(getAt(now, path)) : value;
    return setAt(now, path, next);
  }, document);
}

/** The document with one value set. */
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

/** Faults of the value at a path, or of something in it. */
export function faultsAt(faults: readonly Fault[], path: Path): Fault[] {
  const where = jsonPath(path);
  return faults.filter(
    (fault) => fault.path === where || fault.path.startsWith(`${where}[`) || fault.path.startsWith(`${where}.`),
  );
}

/** What was typed as the file holds it: a number where it is one, else the text, which the reader will refuse at its place. */
export function typedNumber(text: string): unknown {
  const clean = text.trim().replaceAll('\u2009', '').replaceAll('\u2212', '-');
  if (clean === '') return undefined;
  const comma = /^-?\d+,\d+$/.test(clean) ? clean.replace(',', '.') : clean;
  const value = Number(comma);
  return Number.isFinite(value) ? value : clean;
}

/** A value of the file as its cell shows it. */
export function shown(value: unknown): string {
  if (value === undefined || value === null) return '';
  return typeof value === 'string' ? value : JSON.stringify(value);
}

/** Cells of a block pasted from a spreadsheet. */
export function pastedCells(text: string): string[][] {
  return text
    .replace(/\r?\n$/, '')
    .split(/\r?\n/)
    .map((row) => row.split('\t'));
}
