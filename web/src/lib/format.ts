/** The one place where numbers become text. */

const THIN = '\u2009';
const MINUS = '\u2212';

/** A number to three or four significant figures, with a true minus and thin spaces between thousands. */
export function figure(value: number, significant = 4): string {
  if (!Number.isFinite(value)) return '–';
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size < 1e-9) return '0';
  const digits = size >= 1e7 || size < 1e-4 ? value.toExponential(significant - 1) : fixed(size, significant);
  const [whole = '', part] = digits.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, THIN);
  const text = part === undefined ? grouped : `${grouped}.${part}`;
  return value < 0 && !text.startsWith('-') ? `${MINUS}${text}` : text.replace('-', MINUS);
}

function fixed(size: number, significant: number): string {
  const decimals = Math.max(0, significant - 1 - Math.floor(Math.log10(size)));
  return size.toFixed(Math.min(decimals, 6));
}

/** A number with its unit. */
export function quantity(value: number, unit: string, significant = 3): string {
  return unit === '1' || unit === '' ? figure(value, significant) : `${figure(value, significant)}${THIN}${unit}`;
}

export function senseSign(sense: number): string {
  return sense === 1 ? '+' : MINUS;
}

export function percent(share: number): string {
  return `${figure(share * 100, 3)}${THIN}%`;
}

export function when(iso: string): string {
  return new Date(iso).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short' });
}

/** The first letters of a hash, as sheets show it. */
export function shortHash(hash: string): string {
  return hash.slice(0, 10);
}
