/** Arithmetic on printed text, written without the engine: infix to postfix by precedence, then a stack. */

const PRECEDENCE: Readonly<Record<string, number>> = { '+': 1, '−': 1, '·': 2, '/': 2, negate: 3, '^': 4 };
const CALLS: Readonly<Record<string, (x: number[]) => number>> = {
  abs: ([x = NaN]) => Math.abs(x),
  sqrt: ([x = NaN]) => Math.sqrt(x),
  max: (x) => Math.max(...x),
  min: (x) => Math.min(...x),
};

type Token = {
  readonly kind: 'number' | 'symbol' | 'operator' | 'call';
  readonly text: string;
  readonly count?: number;
};
const known = new Map<string, readonly Token[]>();

export function calculate(formula: string, values: ReadonlyMap<string, number>): number {
  let postfix = known.get(formula);
  if (postfix === undefined) known.set(formula, (postfix = toPostfix(formula)));
  const stack: number[] = [];
  const pop = (): number => {
    const value = stack.pop();
    if (value === undefined) throw new Error(`${formula}: nothing left to take`);
    return value;
  };
  for (const { kind, text, count = 0 } of postfix) {
    if (kind === 'number') stack.push(Number(text));
    else if (kind === 'symbol') {
      const value = values.get(text);
      if (value === undefined) throw new Error(`${formula}: ${text} has no value`);
      stack.push(value);
    } else if (kind === 'call') {
      const call = CALLS[text];
      if (call === undefined) throw new Error(`${formula}: no function ${text}`);
      stack.push(call(stack.splice(stack.length - count, count)));
    } else if (text === 'negate') stack.push(-pop());
    else {
      const b = pop();
      const a = pop();
      stack.push(text === '+' ? a + b : text === '−' ? a - b : text === '·' ? a * b : text === '/' ? a / b : a ** b);
    }
  }
  const result = pop();
  if (stack.length > 0) throw new Error(`${formula}: ${stack.length} numbers left over`);
  return result;
}

function toPostfix(formula: string): Token[] {
  const out: Token[] = [];
  const open: { text: string; commas: number }[] = [];
  let before: 'value' | 'none' = 'none';
  const emit = (text: string): void => {
    out.push({ kind: 'operator', text });
  };
  for (const [token] of formula.matchAll(/\d+(?:\.\d+)?|[\p{L}][\p{L}\p{N}_′]*|\S/gu)) {
    const top = (): string => open[open.length - 1]?.text ?? '(';
    if (/^\d/.test(token)) out.push({ kind: 'number', text: token });
    else if (token in CALLS) {
      open.push({ text: token, commas: 0 });
      before = 'none';
      continue;
    } else if (/^\p{L}/u.test(token)) out.push({ kind: 'symbol', text: token });
    else if (token === '(') {
      open.push({ text: '(', commas: 0 });
      before = 'none';
      continue;
    } else if (token === ')' || token === ',') {
      while (top() !== '(') emit(open.pop()?.text ?? '');
      const bracket = open[open.length - 1];
      if (bracket === undefined) throw new Error(`${formula}: a bracket too many`);
      if (token === ',') {
        bracket.commas += 1;
        before = 'none';
        continue;
      }
      open.pop();
      const call = open[open.length - 1];
      if (call !== undefined && call.text in CALLS) {
        open.pop();
        out.push({ kind: 'call', text: call.text, count: bracket.commas + 1 });
      }
    } else {
      const operator = token === '−' && before === 'none' ? 'negate' : token;
      const own = PRECEDENCE[operator];
      if (own === undefined) throw new Error(`${formula}: cannot read ${token}`);
      while (operator !== 'negate' && (PRECEDENCE[top()] ?? 0) >= own) emit(open.pop()?.text ?? '');
      open.push({ text: operator, commas: 0 });
      before = 'none';
      continue;
    }
    before = 'value';
  }
  while (open.length > 0) emit(open.pop()?.text ?? '');
  return out;
}
