/** Diaphragms that move as one body, by the member under which their rows stand. */
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { runOf, type Context } from './context.js';

/** At its level, or under its own key where a level has several diaphragms. */
export function bodyMember(context: Context, { diaphragm }: DiaphragmOutcome): string {
  const level = context.model.levels[diaphragm.level];
  return level !== undefined && level.diaphragms.length === 1 ? level.id : diaphragm.key;
}

/** The body of a level's row. */
export function bodyOf(context: Context, { member, case: caseId }: Pick<Demand, 'member' | 'case'>): DiaphragmOutcome {
  for (const outcome of runOf(context, caseId).outcomes) {
    for (const diaphragm of outcome?.diaphragms ?? []) {
      if (diaphragm.rigid !== undefined && bodyMember(context, diaphragm) === member) return diaphragm;
    }
  }
  throw new Error(`no body ${member}`);
}
