import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { executablePath, openDashboard, type Dashboard } from './dashboard.js';

let dashboard: Dashboard;

describe.skipIf(executablePath === undefined)('the main way through the dashboard', () => {
  beforeAll(async () => {
    dashboard = await openDashboard();
  });
  afterAll(() => dashboard.close());

  test('the one-time link makes the visitor the owner, with the demo before him', async () => {
    const { page } = dashboard;
    await page.goto(dashboard.ownerLink);
    await page.getByLabel('Name').fill('Ada Marsh');
    await page.getByLabel('E-mail').fill('ada@example.org');
    await page.getByLabel(/^Password/).fill('a long password');
    await page.getByRole('button', { name: 'Make the account' }).click();
    await page.getByRole('link', { name: 'Demo: Ropewalk Yard, House 2' }).click();
    await page.waitForURL(/\/projects\/[0-9a-f-]+$/);
    await page.getByRole('row', { name: /First design/ }).waitFor();
    expect(await page.getByRole('table').first().innerText()).toContain('Engineer’s answer');
  });

  test('a level: plan, diagrams and figures of the chosen case, with the engine’s numbers', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'level?level=L3&case=EY'));
    await page.getByLabel('Plan of level L3').waitFor();
    expect(await page.locator('.diagram svg').count()).toBe(5);
    const { demands } = await dashboard.json<{ demands: { value: number }[] }>(
      `/api/projects/${await dashboard.project()}/revisions/${(await dashboard.revisions())[0]?.id ?? ''}/demands?member=L3&quantity=storey-shear&case=EY&sense=1`,
    );
    const row = page.getByRole('row', { name: /Storey shear/ });
    expect(await row.innerText()).toContain((demands[0]?.value ?? NaN).toPrecision(3));
    await dashboard.picture('level');
  });

  test('the other sense turns the reactions', async () => {
    const { page } = dashboard;
    const reaction = page.getByRole('region', { name: 'Wall lines and their collectors' }).locator('.figure').first();
    const before = await reaction.innerText();
    await page.getByRole('button', { name: '− against the case' }).click();
    await expect.poll(() => reaction.innerText()).toBe(`−${before}`);
    expect(page.url()).toContain('sense=-1');
  });

  test('a wall line that stops: what arrives, its end forces, and the transfer', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'wall-line?line=4&case=EY'));
    const elevation = page.getByRole('img', { name: /^Elevation of wall line/ });
    expect(await elevation.innerHTML()).toContain('into the diaphragm');
    await page.getByRole('link', { name: /transfer, Level 2/ }).click();
    await page.waitForURL(/path\?member=4%2FL3/);
    await dashboard.picture('wall-line');
  });

  test('the path: a member picked in the drawing, with shares that add up to the whole', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'path?case=EY'));
    await page.getByRole('button', { name: 'Wall line 3 under Level 2' }).click();
    const up = page.getByRole('region', { name: 'Up: the masses that feed it' });
    await up.waitFor();
    expect(page.url()).toContain('member=3%2FL2');
    expect(await up.innerText()).toContain('roof/roof-main');
    for (const part of [up, page.getByRole('region', { name: 'Down: the supports where it ends' })])
      expect(await part.locator('tfoot').innerText()).toMatch(/100(\.0)?\s%/);
    await dashboard.picture('path');
  });

  test('the foundation: a support picked on plan, its governing demands, the schedule as CSV', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'foundation'));
    await page.getByRole('button', { name: 'Support F1, 1/1a/from' }).click();
    await expect
      .poll(() => page.getByRole('region', { name: 'Governing demands by support' }).locator('tbody tr').count())
      .toBe(1);
    expect(await page.locator('main').innerText()).toContain('licensed engineer');
    await dashboard.picture('foundation');
    const arriving = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Schedule as CSV' }).click();
    const csv = readFileSync(await (await arriving).path(), 'utf8');
    expect(csv.split('\r\n')[0]).toContain('support,member');
    expect(csv).toContain('1/1a/from');
  });

  test('a new revision from the last one; a pier is lengthened; the comparison shows it', async () => {
    const { page } = dashboard;
    await page.goto(`${dashboard.url}/projects/${await dashboard.project()}`);
    await page.getByRole('button', { name: 'New revision from the last one' }).click();
    await page.waitForURL(/\/building/);
    const from = page.getByLabel('From of 1/L2/1a', { exact: true });
    await from.fill('0.5');
    await from.press('Enter');
    await page.getByRole('button', { name: 'Save and analyse' }).click();
    await expect.poll(async () => (await dashboard.revisions())[3]?.version, { timeout: 30_000 }).toBe(2);
    await page.getByRole('link', { name: 'Compare', exact: true }).click();
    await page.getByText('wall line 1, storey under L2, pier 1a, from: 1 → 0.5').waitFor();
    expect(await page.getByRole('region', { name: 'Changed demands' }).innerText()).toContain('1/L2/1a');
    expect(await page.getByLabel('Plan of level L2').innerHTML()).toContain('▼');
    await dashboard.picture('compare');
  });

  test('findings and certificate stand one click from the title block', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'level'));
    await page
      .locator('.block')
      .getByRole('link', { name: /open ends/ })
      .click();
    await page
      .getByRole('row', { name: /post-on-nothing/ })
      .first()
      .waitFor();
    const checks = await page.getByRole('region', { name: 'Checks of the certificate' }).innerText();
    expect(checks).toContain('building: base shear');
    expect(checks).not.toContain('above');
    await dashboard.picture('findings');
  });

  test('no script of the dashboard failed on the way', () => {
    expect(dashboard.errors).toEqual([]);
  });
});
