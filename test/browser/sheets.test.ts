import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { executablePath, openDashboard, type Dashboard } from './dashboard.js';

let dashboard: Dashboard;

const VIEWS = [
  'building?section=forces',
  'building?section=piers',
  'level?level=L2&case=EX',
  'level?level=roof&case=EY',
  'wall-line?line=D',
  'path?case=EY&member=3%2FL2',
  'foundation',
  'foundation?show=all',
  'findings',
] as const;

describe.skipIf(executablePath === undefined)('the dashboard’s sheets', () => {
  beforeAll(async () => {
    dashboard = await openDashboard();
    await dashboard.becomeOwner();
  });
  afterAll(() => dashboard.close());

  test('diagrams stand under the plan on its own scale: a wall line is at one place in both', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'level?level=roof&case=EY'));
    const inDiagram = await marks(page);
    for (const line of ['Line 1', 'Line 3', 'Line 6']) {
      const x = centre(await axis(page, line), 'x');
      expect(Math.min(...inDiagram.map((box) => Math.abs(centre(box, 'x') - x)))).toBeLessThan(1);
    }
  });

  test('for a load along x they stand beside the plan, at its own heights', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'level?level=roof&case=EX'));
    const inDiagram = await marks(page);
    for (const line of ['Line A', 'Line D', 'Line F']) {
      const y = centre(await axis(page, line), 'y');
      expect(Math.min(...inDiagram.map((box) => Math.abs(centre(box, 'y') - y)))).toBeLessThan(1);
    }
  });

  test('a cut is moved by keys and read off with the engine’s own values', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'level?level=roof&case=EY'));
    const cut = page.getByRole('slider', { name: 'Cut along the span' });
    await cut.focus();
    await cut.press('Home');
    await cut.press('PageUp');
    const { diagrams } = await dashboard.json<{ diagrams: Diagram[] }>(
      `/api/projects/${await dashboard.project()}/revisions/${(await dashboard.revisions())[0]?.id ?? ''}/analysis`,
    );
    const s = Number(await cut.getAttribute('aria-valuenow'));
    const piece = diagrams
      .find((each) => each.kind === 'diaphragm' && each.level === 'roof' && each.case === 'EY')
      ?.pieces?.find(({ from, to }) => from <= s && s < to);
    const shear = (piece?.shear ?? []).reduce((sum, c, i) => sum + c * (s - (piece?.from ?? 0)) ** i, 0);
    const read = (await cut.getAttribute('aria-valuetext')) ?? '';
    expect(read).toContain(`Shear V ${shear.toPrecision(4).replace('-', '−')}`);
  });

  test('every number says where it comes from, to the pointer and to the keys', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'wall-line?line=2&case=EY'));
    const table = page.getByRole('region', { name: 'Forces into and out of every storey' });
    await table.locator('tbody tr').last().locator('.figure').nth(2).hover();
    const tip = page.getByRole('tooltip');
    await expect.poll(() => tip.innerText()).toContain('from the storey above');
    expect(await tip.innerText()).toContain('2/L2');
    await page.mouse.move(2, 2);
    await table.focus();
    await table.press('ArrowDown');
    await expect.poll(() => tip.innerText()).toContain('reaction of spans 1-2 and 2-3 at line 2');
    await page.keyboard.press('Escape');
    expect(await tip.count()).toBe(0);
  });

  test.each([1440, 390])('no page scrolls sideways at %d px', async (width) => {
    const { page } = dashboard;
    await page.setViewportSize({ width, height: 844 });
    const project = `${dashboard.url}/projects/${await dashboard.project()}`;
    const [first, second] = await dashboard.revisions();
    const addresses = [
      dashboard.url,
      project,
      `${project}/compare?before=${first?.id ?? ''}&after=${second?.id ?? ''}`,
      ...(await Promise.all(VIEWS.map((view) => dashboard.view(2, view)))),
    ];
    for (const [i, address] of addresses.entries()) {
      await page.goto(address);
      await page.locator('main table, main svg').first().waitFor();
      const wide = await page.evaluate(() => document.documentElement.scrollWidth);
      expect(wide, address).toBeLessThanOrEqual(width);
      await dashboard.picture(`sheet-${i}-${width}`);
    }
  });

  test('dark and light are kept from one visit to the next', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'findings'));
    await page.getByRole('button', { name: /Light or dark/ }).click();
    await page.getByRole('button', { name: 'Light', exact: true }).click();
    await page.reload();
    await page.getByRole('button', { name: 'Dark', exact: true }).waitFor();
    const paper = await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
    expect(paper).toBe('rgb(16, 25, 29)');
    await dashboard.picture('dark');
  });

  test('whoever is not signed in comes back, once signed in, to what he wanted to see', async () => {
    const { page } = dashboard;
    const wanted = await dashboard.view(1, 'wall-line?line=4&case=EY');
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL(/\/sign-in/);
    await page.goto(wanted);
    await page.waitForURL(/\/sign-in\?next=/);
    await page.getByLabel('E-mail').fill('ada@example.org');
    await page.getByLabel('Password').fill('a long password');
    await page.locator('form button').click();
    await page.waitForURL(wanted);
    await page.getByRole('img', { name: /^Elevation of wall line/ }).waitFor();
  });

  test('no script of the dashboard failed on the way', () => {
    expect(dashboard.errors).toEqual([]);
  });
});

type Box = { readonly x: number; readonly y: number; readonly width: number; readonly height: number } | null;

type Diagram = {
  readonly kind: string;
  readonly level: string;
  readonly case: string;
  readonly pieces?: readonly { readonly from: number; readonly to: number; readonly shear: readonly number[] }[];
};

/** Where the shear diagram marks the wall lines. */
async function marks(page: Page): Promise<Box[]> {
  const lines = page.locator('.diagram').nth(1).locator('.recharts-reference-line.axis line');
  await lines.first().waitFor({ state: 'attached' });
  return Promise.all((await lines.all()).map((line) => line.boundingBox()));
}

function axis(page: Page, name: string): Promise<Box> {
  return page
    .getByRole('button', { name: new RegExp(`^Wall ${name}\\b|^Wall line ${name}\\b`, 'i') })
    .first()
    .locator('line.axis')
    .boundingBox();
}

function centre(box: Box, axis: 'x' | 'y'): number {
  if (box === null) return NaN;
  return axis === 'x' ? box.x + box.width / 2 : box.y + box.height / 2;
}
