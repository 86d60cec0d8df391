/** The force in an end post at the foot of its pier, one component at a time, from everything that stands above it. */
import type { GravityCase } from '../building/definition.js';
import type { Sense } from '../path/result.js';
import type { Landing, PierFeet } from '../walls/posts.js';
import { fromDemand, fromFile, pierPath, readOff, type Context } from './context.js';
import { landingsOn, postPlace, type PostPlace } from './members.js';
import { endOffsets, storeyHeight } from './piers.js';
import type { Steps, Value } from './steps.js';

/** One cause of force: a gravity load, or a lateral case with its sense. */
export type Cause =
  | { readonly gravity: GravityCase; readonly case?: never; readonly sense?: never }
  | { readonly gravity?: never; readonly case: string; readonly sense: Sense };

/** The workings of posts that a working has already; one for every post and cause. */
export type PostSteps = {
  readonly context: Context;
  readonly steps: Steps;
  readonly known: Map<string, Value | undefined>;
};

export function postSteps(context: Context, steps: Steps): PostSteps {
  return { context, steps, known: new Map() };
}

/**
 * Steps that give the compression at the foot of a post.
 *
 * @returns undefined where the cause gives it none
 */
export function postForce(made: PostSteps, place: PostPlace, cause: Cause): Value | undefined {
  const { pier } = place.foot;
  const key = `${pier.key}/${place.end} ${nameOf(cause)}`;
  if (made.known.has(key)) return made.known.get(key);
  const value = ownForce(
    made,
    place,
    cause,
    `compression at the foot of post ${pier.key}/${place.end} from ${nameOf(cause)}`,
  );
  made.known.set(key, value);
  return value;
}

function ownForce(made: PostSteps, { foot, end }: PostPlace, cause: Cause, what: string): Value | undefined {
  const { context, steps } = made;
  const { line, pier, storey } = foot;
  const terms: string[] = [];
  const values: Value[] = [];
  const term = (text: string, ...of: Value[]): void => {
    terms.push(text);
    values.push(...of);
  };
  if (cause.gravity === undefined) {
    const shear = fromDemand(context, 'V', cause, pier.key, 'shear');
    if (shear !== undefined && shear.value !== 0) {
      const arm = armOf(made, foot);
      term(
        `${end === 'from' ? '− ' : ''}V·(z_top − z_foot)/${arm.symbol}`,
        shear,
        ...storeyHeight(context, storey.level),
        arm,
      );
    }
  } else {
    (pier.pier.gravity ?? []).forEach((load, i) => {
      if (load.case !== cause.gravity || load.perLength === 0) return;
      const path = pierPath(line, pier);
      const { length, perLength } = context.units;
      const weight = fromFile(context, `q_${i + 1}`, `${path}.gravity[${i}].perLength`, perLength);
      const part = partOf(made, foot, end, undefined);
      if (part === undefined) return;
      term(
        `${weight.symbol}·(x_to − x_from)·${part.symbol}`,
        weight,
        fromFile(context, 'x_to', `${path}.to`, length),
        fromFile(context, 'x_from', `${path}.from`, length),
        part,
      );
    });
  }
  for (const landing of landingsOn(context, foot)) {
    const above = postForce(made, postPlace(context, landing.column.key), cause);
    if (above === undefined) continue;
    const part = partOf(made, foot, end, landing);
    if (part === undefined) continue;
    term(`${above.symbol}·${part.symbol}`, above, part);
  }
  if (terms.length === 0) return undefined;
  return steps.add(steps.fresh('C'), joined(terms), values, context.units.force, {
    what,
    clause: 'statics of a cantilever wall on two end posts',
  });
}

function joined(terms: readonly string[]): string {
  return terms
    .map((term, i) => (i === 0 || term.startsWith('−') ? term : `+ ${term}`))
    .join(' ')
    .replace(/^− /, '−');
}

/** Distance between a pier's end posts. */
export function armOf({ context, steps, known }: PostSteps, foot: PierFeet): Value {
  const key = `${foot.pier.key} arm`;
  let arm = known.get(key);
  if (arm === undefined) {
    const { length } = context.units;
    const path = pierPath(foot.line, foot.pier);
    arm = steps.add(
      steps.fresh('b'),
      'x_to − o_to − (x_from + o_from)',
      [
        fromFile(context, 'x_to', `${path}.to`, length),
        fromFile(context, 'x_from', `${path}.from`, length),
        ...endOffsets(context, foot),
      ],
      length,
      { what: `distance between the end posts of pier ${foot.pier.key}` },
    );
    known.set(key, arm);
  }
  return arm;
}

/**
 * The part of a force on a pier that goes to one of its posts, by statics.
 *
 * @param landing the post that lands on the pier; the middle of the pier where there is none
 * @returns undefined where nothing of it goes to the post
 */
function partOf(made: PostSteps, foot: PierFeet, end: 'from' | 'to', landing: Landing | undefined): Value | undefined {
  const { context, steps, known } = made;
  const { line, pier } = foot;
  const key = `${pier.key}/${end} part of ${landing?.column.key ?? 'middle'}`;
  const place = landing === undefined ? undefined : placeOn(foot, landing);
  const farPart = place === undefined ? undefined : (place - pier.posts[0]) / pier.arm;
  if (farPart === (end === 'from' ? 1 : 0)) return undefined;
  const made1 = known.get(key);
  if (made1 !== undefined) return made1;
  const arm = armOf(made, foot);
  const { length } = context.units;
  const path = pierPath(line, pier);
  const from = fromFile(context, 'x_from', `${path}.from`, length);
  const to = fromFile(context, 'x_to', `${path}.to`, length);
  const at =
    landing === undefined || place === undefined
      ? undefined
      : readOff(
          context,
          'x',
          `wallLines[${line.index}].axis`,
          place,
          length,
          `where post ${landing.column.key} lands on the axis`,
        );
  const where = at === undefined ? '(x_from + x_to)/2' : 'x';
  const [near, far] = endOffsets(context, foot);
  const value =
    end === 'to'
      ? steps.add(
          steps.fresh('p'),
          `(${where} − x_from − o_from)/${arm.symbol}`,
          [...(at === undefined ? [to] : [at]), from, near, arm],
          '1',
          notes(pier.key, end),
        )
      : steps.add(
          steps.fresh('p'),
          `(x_to − o_to − ${where})/${arm.symbol}`,
          [...(at === undefined ? [from] : [at]), to, far, arm],
          '1',
          notes(pier.key, end),
        );
  known.set(key, value);
  return value;
}

function notes(pier: string, end: string) {
  return { what: `part that goes to post ${pier}/${end}`, clause: 'statics of the pier on its two posts' };
}

/** Distance along the pier's own axis of a post that lands on it. */
function placeOn({ line }: PierFeet, { column }: Landing): number {
  if (column.line === line) return column.at;
  const [x, y] = line.line.axis[0];
  return (column.place[0] - x) * line.along[0] + (column.place[1] - y) * line.along[1];
}

export function nameOf(cause: Cause): string {
  return cause.gravity ?? `${cause.case} ${cause.sense === 1 ? '+' : '−'}`;
}
