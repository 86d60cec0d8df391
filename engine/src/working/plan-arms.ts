/** Wall lines as springs in the plane of a floor: their stiffness, and their arm about a point of the plan. */
import type { StoreyModel, LineModel } from '../walls/wall-line.js';
import { fromFile, linePath, readOff, type Context } from './context.js';
import { pierLength, pierStiffness } from './piers.js';
import { sumOf, type Steps, type Value } from './steps.js';

/** A direction cosine of a line; `none` where the line has no part along that axis. */
export type Cosine = { readonly sign: 1 | -1; readonly value?: Value };

export type Cosines = { readonly x: Cosine | undefined; readonly y: Cosine | undefined };

export function cosinesOf(context: Context, line: LineModel, tag: string): Cosines {
  const of = (part: number, axis: 'x' | 'y'): Cosine | undefined => {
    if (part === 0) return undefined;
    if (Math.abs(part) === 1) return { sign: part > 0 ? 1 : -1 };
    const what = `cosine of line ${line.line.id} against ${axis}`;
    return { sign: 1, value: readOff(context, `c_${axis}${tag}`, `${linePath(line)}.axis`, part, '1', what) };
  };
  return { x: of(line.along[0], 'x'), y: of(line.along[1], 'y') };
}

/** `+ a·b` of a cosine and a text; empty where there is none. */
export function alongAxis(cosine: Cosine | undefined, text: string): string {
  if (cosine === undefined) return '';
  return `${cosine.sign < 0 ? '−' : '+'} ${cosine.value === undefined ? '' : `${cosine.value.symbol}·`}${text}`;
}

/** Terms with their signs as one expression. */
export function joined(terms: readonly string[]): string {
  const text = terms.filter((term) => term !== '').join(' ');
  if (text === '') return '0';
  return text.startsWith('+ ') ? text.slice(2) : text.replace(/^− /, '−');
}

export function cosineValues(...of: readonly Cosines[]): Value[] {
  return of.flatMap(({ x, y }) => [x, y]).flatMap((cosine) => (cosine?.value === undefined ? [] : [cosine.value]));
}

/** The line's arm about a point: the moment of a unit force along its axis. */
export function armStep(
  context: Context,
  line: LineModel,
  about: { readonly x: Value; readonly y: Value } | undefined,
  steps: Steps,
  tag: string,
): Value {
  const cosines = cosinesOf(context, line, '');
  const path = `${linePath(line)}.axis[0]`;
  const { length } = context.units;
  const x = fromFile(context, 'x', `${path}[0]`, length);
  const y = fromFile(context, 'y', `${path}[1]`, length);
  const flipped: Cosine | undefined =
    cosines.x === undefined ? undefined : { ...cosines.x, sign: cosines.x.sign === 1 ? -1 : 1 };
  const dx = about === undefined ? 'x' : `(x − ${about.x.symbol})`;
  const dy = about === undefined ? 'y' : `(y − ${about.y.symbol})`;
  return steps.add(
    `r_${tag}`,
    joined([alongAxis(cosines.y, dx), alongAxis(flipped, dy)]),
    [
      ...(cosines.y === undefined ? [] : [x, ...(about === undefined ? [] : [about.x])]),
      ...(cosines.x === undefined ? [] : [y, ...(about === undefined ? [] : [about.y])]),
      ...cosineValues(cosines),
    ],
    length,
    { what: `arm of line ${line.line.id}` },
  );
}

/** Stiffness of a line in a storey: the sum of its piers; their length where not every stiffness of the floor is known. */
export function stiffnessStep(
  context: Context,
  storey: StoreyModel,
  absolute: boolean,
  steps: Steps,
  tag: string,
): Value {
  const { line } = storey;
  const level = context.model.levels[storey.level]?.id ?? '';
  const piers = storey.piers.map((pier, i) => {
    const place = { line, storey, level, pier };
    if (!absolute) return pierLength(context, place, steps.fresh(`b_${tag}_${i + 1}`), steps);
    return pierStiffness(context, place, `k_${tag}_${i + 1}`, steps);
  });
  return steps.add(`k_${tag}`, sumOf(piers), piers, piers[0]?.unit ?? '1', {
    what: absolute
      ? `stiffness of line ${line.line.id}`
      : `length of piers of line ${line.line.id}, for its relative stiffness`,
  });
}
