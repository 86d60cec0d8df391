/** What stands under walls that stop: piers and posts that carry end posts which do not go on in their own plane. */
import type { PierFeet, PostDescent } from '../walls/posts.js';

export type Supporting = {
  readonly feet: ReadonlySet<PierFeet>;
  /** Keys of posts that are carried down to the base without a pier. */
  readonly columns: ReadonlySet<string>;
};

/**
 * Everything from the landing of such an end post down to the base.
 *
 * Source: ASCE 7-16 12.3.3.3, horizontal irregularity type 4 and vertical irregularity type 4.
 */
export function supportingOf({ landings }: PostDescent): Supporting {
  const feet = new Set<PierFeet>();
  const columns = new Set<string>();
  // Landings come from the top down, so that a mark goes all the way.
  for (const { on, column, foot } of landings) {
    if (on === 'nothing') columns.add(column.key);
    if (foot === undefined || (on === 'stands' && !columns.has(column.key))) continue;
    feet.add(foot);
    columns.add(`${foot.pier.key}/from`).add(`${foot.pier.key}/to`);
  }
  return { feet, columns };
}
