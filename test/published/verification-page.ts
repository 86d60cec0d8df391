/** The verification page: one section for each test file, its checks grouped by source. */
import type { Check } from './verification.js';

export const PAGE = new URL('./VERIFICATION.md', import.meta.url);
export const RENEW = 'npm run verification';

const HEAD = `# What the engine is held to

Made by the tests of this folder from what they found in their last run; a test fails when this page is not what they would make.
Renew it by \`npm run verification\`.

Each value has a standing. **seen**: the number was read in the document. **recalled**: it was written down from memory and not checked
against the document. **derived**: it was worked out by hand from the named equation or from statics, and no document prints it.
Published examples round between their steps; the tolerance is that of the printed digits. A difference of less than 1e-9 of the value
is shown as 0. Lists show the largest difference.
`;

const START = '\n## ';

/** The page with the section of one test file put in its place, or replaced. */
export function withSection(page: string, file: string, checks: readonly Check[]): string {
  const sections = new Map(sectionsOf(page).map((section) => [fileOf(section), section]));
  sections.set(file, sectionFor(file, checks));
  return pageOf([...sections.values()]);
}

/** The page without the sections of files that are no more. */
export function onlySections(page: string, files: readonly string[]): string {
  return pageOf(sectionsOf(page).filter((section) => files.includes(fileOf(section))));
}

export function sectionOf(page: string, file: string): string | undefined {
  return sectionsOf(page).find((section) => fileOf(section) === file);
}

export function filesOf(page: string): string[] {
  return sectionsOf(page).map(fileOf);
}

function sectionsOf(page: string): string[] {
  return page
    .split(START)
    .slice(1)
    .map((section) => section.trimEnd());
}

function pageOf(sections: readonly string[]): string {
  const sorted = [...sections].sort((a, b) => (fileOf(a) < fileOf(b) ? -1 : 1));
  return HEAD + sorted.map((section) => `${START}${section}\n`).join('');
}

function fileOf(section: string): string {
  return section.slice(0, section.indexOf('\n')).replace(/^.*\(|\).*$/g, '');
}

function sectionFor(file: string, checks: readonly Check[]): string {
  const title = file.replace('.test.ts', '').replaceAll('-', ' ');
  const standings = (['seen', 'recalled', 'derived'] as const).map(
    (standing) => `${checks.filter(({ seen }) => seen === standing).length} ${standing}`,
  );
  const sources = [...new Set(checks.map(({ source }) => source))];
  const tables = sources.map((source) => {
    const rows = checks.filter((check) => check.source === source).map(rowOf);
    const head = '| case | standing | expected | got | difference | tolerance |\n| --- | --- | --- | --- | --- | --- |';
    return `### ${source}\n\n${[head, ...rows].join('\n')}`;
  });
  const name = `${title.charAt(0).toUpperCase()}${title.slice(1)}`;
  return [`[${name}](${file})`, `${checks.length} checks: ${standings.join(', ')}.`, ...tables].join('\n\n');
}

function rowOf(check: Check): string {
  const { expected, got, within } = check;
  const cells = [check.case, check.seen, valueText(expected), valueText(got), differenceOf(expected, got)];
  return `| ${[...cells, within === undefined ? 'equal' : shown(within, 3)].join(' | ')} |`;
}

function valueText(value: Check['expected'] | Check['got'] | readonly (number | undefined)[]): string {
  if (value === undefined) return '–';
  if (typeof value === 'number') return shown(value, 7);
  return typeof value === 'object' ? value.map((each) => valueText(each)).join(', ') : String(value);
}

function differenceOf(expected: Check['expected'], got: Check['got'] | readonly (number | undefined)[]): string {
  if (typeof expected === 'string' || typeof expected === 'boolean') return expected === got ? 'none' : 'other';
  const wanted = typeof expected === 'number' ? [expected] : expected;
  const found = (typeof got === 'object' ? got : [got]) as readonly (number | undefined)[];
  const differences = wanted.map((value, i) => {
    const difference = (found[i] ?? NaN) - value;
    return Math.abs(difference) <= 1e-9 * Math.max(1e-3, Math.abs(value)) ? 0 : difference;
  });
  return shown(
    differences.reduce((most, each) => (Math.abs(each) > Math.abs(most) ? each : most), 0),
    2,
  );
}

/** Significant digits without trailing zeros: the last bits of a computed number are none of the page's. */
function shown(value: number, digits: number): string {
  return String(Number((Math.abs(value) < 1e-12 ? 0 : value).toPrecision(digits)));
}
