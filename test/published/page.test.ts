import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { filesOf, onlySections, PAGE, RENEW } from './verification-page.js';

test('the verification page has a section for every test file that checks published cases, and no other', () => {
  const folder = new URL('.', import.meta.url);
  const files = readdirSync(folder)
    .filter((name) => name.endsWith('.test.ts'))
    .filter((name) => /^import .* from '.\/verification.js';/m.test(readFileSync(new URL(name, folder), 'utf8')))
    .sort();
  const page = readFileSync(PAGE, 'utf8');
  if (process.env['GROUNDWARD_VERIFICATION'] === 'write') writeFileSync(PAGE, onlySections(page, files));
  else expect(filesOf(page), `VERIFICATION.md: renew it by: ${RENEW}`).toEqual(files);
});
