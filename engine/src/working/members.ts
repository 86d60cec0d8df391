/** Where the members of a working stand in the prepared building. */
import type { Landing, PierFeet } from '../walls/posts.js';
import type { LineModel, PierModel, StoreyModel } from '../walls/wall-line.js';
import type { Context } from './context.js';

export type StoreyPlace = { readonly line: LineModel; readonly storey: StoreyModel; readonly level: string };
export type PierPlace = StoreyPlace & { readonly pier: PierModel };

/** The foot of an end post: a pier's near end (`from`) or far end (`to`). */
export type PostPlace = { readonly foot: PierFeet; readonly end: 'from' | 'to' };

type Members = {
  readonly storeys: ReadonlyMap<string, StoreyPlace>;
  readonly piers: ReadonlyMap<string, PierPlace>;
  readonly feet: ReadonlyMap<string, PierFeet>;
  readonly landings: ReadonlyMap<PierFeet, readonly Landing[]>;
};

const made = new WeakMap<Context, Members>();

/** `line/under` */
export function storeyPlace(context: Context, member: string): StoreyPlace {
  return found(membersOf(context).storeys.get(member), member);
}

/** `line/under/pier` */
export function pierPlace(context: Context, member: string): PierPlace {
  return found(membersOf(context).piers.get(member), member);
}

export function footOf(context: Context, pier: string): PierFeet {
  return found(membersOf(context).feet.get(pier), pier);
}

/** `line/under/pier/from` or `…/to` */
export function postPlace(context: Context, key: string): PostPlace {
  const cut = key.lastIndexOf('/');
  const end = key.slice(cut + 1);
  if (end !== 'from' && end !== 'to') throw new Error(`no end post ${key}`);
  return { foot: footOf(context, key.slice(0, cut)), end };
}

/** End posts from above that land on a pier. */
export function landingsOn(context: Context, foot: PierFeet): readonly Landing[] {
  return membersOf(context).landings.get(foot) ?? [];
}

function found<T>(value: T | undefined, member: string): T {
  if (value === undefined) throw new Error(`no member ${member}`);
  return value;
}

function membersOf(context: Context): Members {
  let members = made.get(context);
  if (members === undefined) made.set(context, (members = gather(context)));
  return members;
}

function gather({ model, descent }: Context): Members {
  const storeys = new Map<string, StoreyPlace>();
  const piers = new Map<string, PierPlace>();
  for (const line of model.lines) {
    for (const storey of line.storeys) {
      if (storey === undefined) continue;
      const level = model.levels[storey.level]?.id ?? '';
      storeys.set(`${line.line.id}/${level}`, { line, storey, level });
      for (const pier of storey.piers) piers.set(pier.key, { line, storey, level, pier });
    }
  }
  const landings = new Map<PierFeet, Landing[]>();
  for (const landing of descent.landings) {
    if (landing.foot === undefined) continue;
    const known = landings.get(landing.foot);
    if (known === undefined) landings.set(landing.foot, [landing]);
    else known.push(landing);
  }
  return { storeys, piers, feet: new Map(descent.feet.flat().map((foot) => [foot.pier.key, foot])), landings };
}
