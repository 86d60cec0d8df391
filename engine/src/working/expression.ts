/** The arithmetic of a working: the same text that is printed is what is computed. */

/** An expression that has been read; `valueOf` gives the values of its symbols. */
export type Expression = (valueOf: (symbol: string) => number) => number;

const FUNCTIONS: Readonly<Record<string, (...x: number[]) => number>> = {
  abs: (x = NaN) => Math.abs(x),
  max: Math.max,
  min: Math.min,
  sqrt: (x = NaN) => Math.sqrt(x),
};

const TOKEN = /\s*(?:(\d+(?:\.\d+)?)|([\p{L}][\p{L}\p{N}_′]*)|([+−·/^(),]))/uy;

/** What is left of a sum below this part of its addends is their rounding, and counts as 0. */
const ROUNDING = 1e-13;

/** Workings of one kind repeat their formulas: what was read is kept, up to so many. */
const known = new Map<string, Expression>();
const KEPT = 10_000;

/**
 * An expression with + − · / ^ ( ), numbers, symbols, and abs, max, min, sqrt.
 *
 * @throws Error where the text is none
 */
export function expressionOf(text: string): Expression {
  let expression = known.get(text);
  if (expression === undefined) {
    expression = readExpression(text);
    if (known.size >= KEPT) known.clear();
    known.set(text, expression);
  }
  return expression;
}

function readExpression(text: string): Expression {
  const tokens = tokensOf(text);
  let at = 0;
  const peek = (): string | undefined => tokens[at];
  const take = (expected?: string): string => {
    const token = tokens[at];
    if (token === undefined || (expected !== undefined && token !== expected)) {
      throw new Error(`"${text}": expected ${expected ?? 'more'} at ${token ?? 'the end'}`);
    }
    at += 1;
    return token;
  };
  const sum = (): Expression => {
    const terms = [product()];
    const signs = [1];
    while (peek() === '+' || peek() === '−') {
      signs.push(take() === '+' ? 1 : -1);
      terms.push(product());
    }
    const [only] = terms;
    return terms.length === 1 && only !== undefined ? only : (valueOf) => sumOf(terms, signs, valueOf);
  };
  const product = (): Expression => {
    let left = power();
    while (peek() === '·' || peek() === '/') {
      const a = left;
      const divides = take() === '/';
      const b = power();
      left = divides ? (valueOf) => a(valueOf) / b(valueOf) : (valueOf) => a(valueOf) * b(valueOf);
    }
    return left;
  };
  const power = (): Expression => {
    const base = factor();
    if (peek() !== '^') return base;
    take();
    const exponent = factor();
    return (valueOf) => base(valueOf) ** exponent(valueOf);
  };
  const factor = (): Expression => {
    const token = take();
    if (token === '(') {
      const inner = sum();
      take(')');
      return inner;
    }
    if (token === '−') {
      const of = power();
      return (valueOf) => -of(valueOf);
    }
    if (/^\d/.test(token)) {
      const number = Number(token);
      return () => number;
    }
    const call = FUNCTIONS[token];
    if (call === undefined || peek() !== '(') return (valueOf) => valueOf(token);
    take('(');
    const of = [sum()];
    while (peek() === ',') {
      take(',');
      of.push(sum());
    }
    take(')');
    return (valueOf) => call(...of.map((part) => part(valueOf)));
  };
  const whole = sum();
  if (at !== tokens.length) throw new Error(`"${text}": nothing expected at ${tokens[at] ?? ''}`);
  return whole;
}

function sumOf(terms: readonly Expression[], signs: readonly number[], valueOf: (symbol: string) => number): number {
  let total = 0;
  let size = 0;
  terms.forEach((term, i) => {
    const value = term(valueOf);
    size += Math.abs(value);
    total += (signs[i] ?? 1) * value;
  });
  return Math.abs(total) <= ROUNDING * size ? 0 : total;
}

function tokensOf(text: string): string[] {
  const tokens: string[] = [];
  TOKEN.lastIndex = 0;
  const trimmed = text.trimEnd();
  while (TOKEN.lastIndex < trimmed.length) {
    const start = TOKEN.lastIndex;
    const match = TOKEN.exec(trimmed);
    if (match === null) throw new Error(`"${text}": cannot read "${trimmed.slice(start)}"`);
    tokens.push(match[0].trim());
  }
  return tokens;
}
