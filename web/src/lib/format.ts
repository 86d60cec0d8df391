/** The one place where numbers become text. */

const THIN = '\u2009';
const MINUS = '\u2212';
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A number to so many significant figures, with a true minus and thin spaces between thousands. */
export function figure(value: number, significant = 4): string {
  if (!Number.isFinite(value)) return '–';
  const size = Math.abs(value);
  if (size < 1e-9) return '0';
  if (size >= 1e7 || size < 1e-4) return scientific(value, significant - 1);
  const decimals = Math.max(0, significant - 1 - Math.floor(Math.log10(Number(size.toPrecision(significant)))));
  return signed(value, grouped(size.toFixed(Math.min(decimals, 6))));
}

/** A number with its unit. */
export function quantity(value: number, unit: string, significant = 3): string {
  return unit === '1' || unit === '' ? figure(value, significant) : `${figure(value, significant)}${THIN}${unit}`;
}

/** How many there are. */
export function count(value: number): string {
  return grouped(String(value));
}

/** A length or a coordinate as drawings give it: to a thousandth, without idle zeros. */
export function dimension(value: number, unit = ''): string {
  const text = signed(value, grouped(String(Number(Math.abs(value).toFixed(3)))));
  return unit === '' ? text : `${text}${THIN}${unit}`;
}

/** A number as a power of ten, such as 1.6·10⁻¹⁵. */
export function scientific(value: number, decimals = 1): string {
  if (value === 0) return '0';
  const [mantissa = '', exponent = '0'] = Math.abs(value).toExponential(decimals).split('e');
  const power = Math.abs(Number(exponent))
    .toString()
    .replace(/\d/g, (digit) => RAISED[Number(digit)] ?? '');
  return signed(value, `${mantissa}·10${exponent.startsWith('-') ? '⁻' : ''}${power}`);
}

/** A change with its sign, also where it grows. */
export function withSign(text: string, value: number): string {
  return value > 0 ? `+${text}` : text;
}

function grouped(digits: string): string {
  const [whole = '', part] = digits.split('.');
  const groups = whole.replace(/\B(?=(\d{3})+(?!\d))/g, THIN);
  return part === undefined ? groups : `${groups}.${part}`;
}

function signed(value: number, text: string): string {
  return value < 0 && text !== '0' ? `${MINUS}${text}` : text;
}

export function senseSign(sense: number): string {
  return sense === 1 ? '+' : MINUS;
}

export function percent(share: number, significant = 3): string {
  return `${figure(share * 100, significant)}${THIN}%`;
}

/** Words for a quantity's key: `end-tension` reads “end tension”. */
export function words(key: string): string {
  return key.replaceAll('-', ' ');
}

export function when(iso: string): string {
  return new Date(iso).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short' });
}

/** The first letters of a hash, as sheets show it. */
export function shortHash(hash: string): string {
  return hash.slice(0, 12);
}
