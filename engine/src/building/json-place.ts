/** Where a text stops being JSON: the parser of the platform does not always say. */

/** What may stand next. */
type Expected = 'value' | 'value or end' | 'key' | 'key or end' | 'colon' | 'comma or end' | 'nothing';

const WORDS = ['true', 'false', 'null'];
const ESCAPES = '"\\/bfnrt';

/** @returns index of the first character that JSON does not allow there; the text's length where it ends too early */
export function jsonBreak(text: string): number {
  const open: ('{' | '[')[] = [];
  let expected: Expected = 'value';
  let i = 0;
  for (;;) {
    while (i < text.length && ' \t\n\r'.includes(text.charAt(i))) i += 1;
    const char = text.charAt(i);
    if (char === '' || expected === 'nothing') return i;
    const closes = char === '}' ? '{' : char === ']' ? '[' : undefined;
    if (closes !== undefined) {
      const mayEnd = expected === 'comma or end' || expected === (char === '}' ? 'key or end' : 'value or end');
      if (!mayEnd || open.pop() !== closes) return i;
      i += 1;
      expected = open.length === 0 ? 'nothing' : 'comma or end';
    } else if (expected === 'comma or end' || expected === 'colon') {
      if (char !== (expected === 'colon' ? ':' : ',')) return i;
      i += 1;
      expected = expected === 'comma or end' && open[open.length - 1] === '{' ? 'key' : 'value';
    } else if (expected === 'key' || expected === 'key or end') {
      if (char !== '"') return i;
      const { next, whole } = afterString(text, i);
      if (!whole) return next;
      i = next;
      expected = 'colon';
    } else if (char === '{' || char === '[') {
      open.push(char);
      i += 1;
      expected = char === '{' ? 'key or end' : 'value or end';
    } else {
      const { next, whole } = afterScalar(text, i);
      if (!whole) return next;
      i = next;
      expected = open.length === 0 ? 'nothing' : 'comma or end';
    }
  }
}

/** Where a token ends, or the first character that it cannot have. */
type Token = { readonly next: number; readonly whole: boolean };

function afterScalar(text: string, start: number): Token {
  const char = text.charAt(start);
  if (char === '"') return afterString(text, start);
  const word = WORDS.find((candidate) => candidate.startsWith(char));
  if (word === undefined) return afterNumber(text, start);
  let next = start;
  while (next < start + word.length && text.charAt(next) === word.charAt(next - start)) next += 1;
  return { next, whole: next === start + word.length };
}

function afterNumber(text: string, start: number): Token {
  let i = text.charAt(start) === '-' ? start + 1 : start;
  const digits = (): boolean => {
    const from = i;
    while (text.charAt(i) >= '0' && text.charAt(i) <= '9') i += 1;
    return i > from;
  };
  if (text.charAt(i) === '0') i += 1;
  else if (!digits()) return { next: i, whole: false };
  if (text.charAt(i) === '.') {
    i += 1;
    if (!digits()) return { next: i, whole: false };
  }
  if (text.charAt(i) === 'e' || text.charAt(i) === 'E') {
    i += 1;
    if (text.charAt(i) === '+' || text.charAt(i) === '-') i += 1;
    if (!digits()) return { next: i, whole: false };
  }
  return { next: i, whole: true };
}

function afterString(text: string, start: number): Token {
  let i = start + 1;
  while (i < text.length) {
    const char = text.charAt(i);
    if (char === '"') return { next: i + 1, whole: true };
    if (char < ' ') return { next: i, whole: false };
    if (char !== '\\') {
      i += 1;
      continue;
    }
    const escape = text.charAt(i + 1);
    if (escape === 'u') {
      for (let digit = i + 2; digit < i + 6; digit++) {
        if (!/^[0-9a-fA-F]$/.test(text.charAt(digit))) return { next: digit, whole: false };
      }
      i += 6;
    } else if (escape !== '' && ESCAPES.includes(escape)) i += 2;
    else return { next: i + 1, whole: false };
  }
  return { next: text.length, whole: false };
}
