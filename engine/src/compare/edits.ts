/** The edits between two building files: what an engineer would call one change each, as RFC 6902 patches. */
import { applyPatch, type Operation } from 'rfc6902';
import type { Building } from '../building/definition.js';
import { editGroups, groupSentence } from './edit-groups.js';
import { makeEdit } from './make-edit.js';
import { memberEdits, type MemberEdit } from './member-edits.js';
import type { Edit } from './result.js';

/**
 * @returns edits whose patches, applied in order to the earlier file, give the later one
 */
export function editsBetween(before: Building, after: Building): Edit[] {
  return editsOf(before, editGroups(memberEdits(before, after)));
}

/** Groups of edits as the comparison tells them, each with its patch to the file as those before it left it. */
export function editsOf(before: Building, groups: readonly (readonly MemberEdit[])[]): Edit[] {
  const document = structuredClone(before);
  return groups.map((group, i) => ({
    id: `e${i + 1}`,
    what: groupSentence(group),
    patch: group.flatMap((edit) => makeEdit(document, edit)),
  }));
}

/** Ids that members known again by their place take over: one edit ahead of all others, or none. */
export function renamingEdits(before: Building, renamed: Building): Edit[] {
  if (before === renamed) return [];
  const patch: Operation[] = [];
  const visit = (a: unknown, b: unknown, path: string): void => {
    if (typeof b === 'string' && a !== b) patch.push({ op: 'replace', path, value: b });
    if (a === null || b === null || typeof a !== 'object' || typeof b !== 'object') return;
    for (const [key, value] of Object.entries(b)) {
      visit((a as Record<string, unknown>)[key], value, `${path}/${key.replaceAll('~', '~0').replaceAll('/', '~1')}`);
    }
  };
  visit(before, renamed, '');
  return [{ id: 'ids', what: 'ids changed; their members were known again by their place', patch }];
}

/** Applies edits to a building file; used to check that they tell the whole difference. */
export function applyEdits(before: Building, edits: readonly Edit[]): unknown {
  const document: unknown = structuredClone(before);
  for (const edit of edits) {
    for (const error of applyPatch(document, structuredClone([...edit.patch]))) if (error !== null) throw error;
  }
  return document;
}
