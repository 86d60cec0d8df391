/** Makes edits of members on a building file, and writes each down as an RFC 6902 patch. */
import type { Operation } from 'rfc6902';
import { identityOf, isRecord, type Json, type MemberEdit, type Step } from './member-edits.js';

/**
 * Makes one edit on a document, which changes.
 *
 * @returns the same as a patch of the document as it was
 */
export function makeEdit(document: Json, edit: MemberEdit): Operation[] {
  if (edit.kind === 'order') {
    const { value, pointer } = placeOf(document, edit.path);
    return putInOrder(value as Json[], edit.order, pointer);
  }
  const last = edit.path[edit.path.length - 1] as Step;
  const { value: parent, pointer } = placeOf(document, edit.path.slice(0, -1));
  if (typeof last === 'string') return [setKey(parent as Record<string, Json>, last, edit, pointer)];
  return [setEntry(parent as Json[], last.id, edit, pointer)];
}

function setKey(parent: Record<string, Json>, key: string, edit: MemberEdit, pointer: string): Operation {
  const path = `${pointer}/${escape(key)}`;
  if (edit.kind === 'remove') {
    Reflect.deleteProperty(parent, key);
    return { op: 'remove', path };
  }
  const op = key in parent ? 'replace' : 'add';
  parent[key] = structuredClone(edit.after);
  return { op, path, value: edit.after };
}

function setEntry(list: Json[], id: string, edit: MemberEdit, pointer: string): Operation {
  const at = list.findIndex((entry) => identityOf(entry) === id);
  if (edit.kind === 'remove') {
    list.splice(at, 1);
    return { op: 'remove', path: `${pointer}/${at}` };
  }
  if (at >= 0) {
    list[at] = structuredClone(edit.after);
    return { op: 'replace', path: `${pointer}/${at}`, value: edit.after };
  }
  const own = edit.order.indexOf(id);
  const later = new Set(edit.order.slice(own + 1));
  const next = list.findIndex((entry) => later.has(identityOf(entry) ?? ''));
  const place = next < 0 ? list.length : next;
  list.splice(place, 0, structuredClone(edit.after));
  return { op: 'add', path: `${pointer}/${place}`, value: edit.after };
}

/** Entries that the later file has, in its order; what it has not keeps its place behind them. */
function putInOrder(list: Json[], order: readonly string[], pointer: string): Operation[] {
  const operations: Operation[] = [];
  let place = 0;
  for (const id of order) {
    const at = list.findIndex((entry) => identityOf(entry) === id);
    if (at < 0) continue;
    if (at !== place) {
      operations.push({ op: 'move', from: `${pointer}/${at}`, path: `${pointer}/${place}` });
      list.splice(place, 0, ...list.splice(at, 1));
    }
    place += 1;
  }
  return operations;
}

function placeOf(document: Json, path: readonly Step[]): { value: Json; pointer: string } {
  let value = document;
  let pointer = '';
  for (const step of path) {
    if (typeof step === 'string') {
      value = isRecord(value) ? value[step] : undefined;
      pointer += `/${escape(step)}`;
    } else {
      const list = value as Json[];
      const at = list.findIndex((entry) => identityOf(entry) === step.id);
      value = list[at];
      pointer += `/${at}`;
    }
  }
  return { value, pointer };
}

function escape(key: string): string {
  return key.replaceAll('~', '~0').replaceAll('/', '~1');
}
