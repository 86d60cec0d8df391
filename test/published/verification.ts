/** Checks against something outside the project, recorded: the page VERIFICATION.md is made of what the tests found. */
import { readFileSync, writeFileSync } from 'node:fs';
import { basename } from 'node:path';
import { afterAll, beforeEach, expect, type RunnerTask, type RunnerTestFile } from 'vitest';
import { PAGE, RENEW, sectionOf, withSection } from './verification-page.js';

/**
 * Where an expected value comes from: `seen` in the document itself, `recalled` from memory and not checked against the document, or
 * `derived` by hand from a named equation or from statics.
 */
export type Standing = 'seen' | 'recalled' | 'derived';

export type Check = {
  /** What is looked at, in the trade's words, with its unit. */
  readonly case: string;
  /** Document, table or equation, page. */
  readonly source: string;
  readonly seen: Standing;
} & (
  | { readonly expected: number; readonly got: number | undefined; readonly within: number }
  | { readonly expected: readonly number[]; readonly got: readonly (number | undefined)[]; readonly within: number }
  | { readonly expected: string | boolean; readonly got: string | boolean | undefined; readonly within?: never }
);

const checks: Check[] = [];

/** Holds a value to its published one within a tolerance, and records it for the page. */
export function check(each: Check): void {
  checks.push(each);
  const { expected, got } = each;
  if (typeof expected === 'string' || typeof expected === 'boolean') {
    expect(got, each.case).toBe(expected);
    return;
  }
  const wanted = typeof expected === 'number' ? [expected] : expected;
  const found = (Array.isArray(got) ? got : [got]) as (number | undefined)[];
  expect(found, each.case).toHaveLength(wanted.length);
  wanted.forEach((value, i) => {
    // Binary fractions: 0.05 away as printed is 0.05000000000000426 away as computed.
    const bound = (each.within ?? 0) + 1e-12 * Math.abs(value);
    expect(Math.abs((found[i] ?? NaN) - value), `${each.case}: ${found[i]} against ${value}`).toBeLessThanOrEqual(
      bound,
    );
  });
}

let file: RunnerTestFile | undefined;
beforeEach(({ task }) => {
  file = task.file;
});

afterAll(() => {
  if (file === undefined || !wholly(file.tasks)) return;
  const name = basename(file.filepath);
  const page = readFileSync(PAGE, 'utf8');
  const renewed = withSection(page, name, checks);
  if (process.env['GROUNDWARD_VERIFICATION'] === 'write') writeFileSync(PAGE, renewed);
  else expect(sectionOf(page, name), `VERIFICATION.md: renew it by: ${RENEW}`).toBe(sectionOf(renewed, name));
});

/** Whether every test ran and passed: what a filter leaves out says nothing about the page. */
function wholly(tasks: readonly RunnerTask[]): boolean {
  return tasks.every((task) => (task.type === 'suite' ? wholly(task.tasks) : task.result?.state === 'pass'));
}
