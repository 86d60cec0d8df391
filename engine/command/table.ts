/** Plain tables for the terminal: aligned columns, numbers to four significant figures. */

export type Column = { readonly head: string; readonly align?: 'left' | 'right' };

export function tableText(columns: readonly Column[], rows: readonly (readonly string[])[]): string {
  const widths = columns.map((column, c) =>
    rows.reduce((most, row) => Math.max(most, (row[c] ?? '').length), column.head.length),
  );
  const line = (cells: readonly string[]): string =>
    columns
      .map((column, c) => {
        const cell = cells[c] ?? '';
        const width = widths[c] as number;
        return column.align === 'right' ? cell.padStart(width) : cell.padEnd(width);
      })
      .join('  ')
      .trimEnd();
  return (
    [
      line(columns.map((column) => column.head)),
      line(widths.map((width) => '-'.repeat(width))),
      ...rows.map(line),
    ].join('\n') + '\n'
  );
}

/** A number to four significant figures, without an exponent where it can be avoided. */
export function figure(value: number): string {
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size >= 1e7 || size < 1e-4) return value.toExponential(3);
  const decimals = Math.max(0, 3 - Math.floor(Math.log10(size)));
  return value.toFixed(decimals);
}

export function senseText(sense: number): string {
  return sense === 1 ? '+' : '−';
}
