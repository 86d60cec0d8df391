/** An entry of the audit trail in one sentence. */

type Row = Readonly<Record<string, unknown>>;

/** @param names of people by the ids of their accounts */
export function sentenceOf(
  subject: string,
  operation: string,
  before: Row,
  after: Row,
  names: ReadonlyMap<string, string>,
): string {
  switch (subject) {
    case 'project':
      return projectSentence(operation, before, after);
    case 'membership':
      return membershipSentence(operation, before, after, names);
    case 'link':
      return linkSentence(operation, before, after);
    case 'revision':
      return revisionSentence(operation, before, after);
    default:
      return `${subject}: ${operation}`;
  }
}

function projectSentence(operation: string, before: Row, after: Row): string {
  if (operation === 'insert') return `Project “${text(after, 'name')}” made`;
  if (operation === 'delete') return `Project “${text(before, 'name')}” deleted`;
  return `Project renamed from “${text(before, 'name')}” to “${text(after, 'name')}”`;
}

function membershipSentence(operation: string, before: Row, after: Row, names: ReadonlyMap<string, string>): string {
  const id = text(operation === 'delete' ? before : after, 'user_id');
  const name = names.get(id) ?? 'somebody whose account is gone';
  if (operation === 'insert') return `${name} let in as ${text(after, 'role')}`;
  if (operation === 'delete') return `${name} taken out; was ${text(before, 'role')}`;
  return `${name}: ${text(before, 'role')} → ${text(after, 'role')}`;
}

function linkSentence(operation: string, before: Row, after: Row): string {
  const link = operation === 'delete' ? before : after;
  const whom = `${text(link, 'email') || 'nobody by name'} as ${text(link, 'role')}`;
  if (operation === 'insert') return `Invitation made for ${whom}`;
  if (operation === 'delete') return `Invitation withdrawn for ${whom}`;
  return after['used_at'] === null ? `Invitation given back to ${whom}` : `Invitation used by ${whom}`;
}

function revisionSentence(operation: string, before: Row, after: Row): string {
  const row = operation === 'delete' ? before : after;
  const which = `Revision ${text(row, 'number')} “${text(row, 'name')}”`;
  if (operation === 'insert') return `${which} made, hash ${hash(after)}`;
  if (operation === 'delete') return `${which} deleted, hash ${hash(before)}`;
  const parts: string[] = [];
  if (before['state'] !== after['state'])
    parts.push(`${text(after, 'state')} for ${text(after, 'purpose') || 'no purpose'}`);
  if (before['hash'] !== after['hash']) parts.push(`building saved, hash ${hash(before)} → ${hash(after)}`);
  if (before['name'] !== after['name']) parts.push(`renamed from “${text(before, 'name')}”`);
  if (before['remarks'] !== after['remarks'] && before['state'] === after['state']) parts.push('remarks changed');
  return `${which}: ${parts.length === 0 ? 'saved without a change' : parts.join(', ')}`;
}

function text(row: Row, key: string): string {
  const value = row[key];
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}

function hash(row: Row): string {
  return text(row, 'hash').slice(0, 12);
}
