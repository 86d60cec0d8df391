import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { executablePath, openDashboard, type Dashboard } from './dashboard.js';

describe.skipIf(executablePath === undefined).each([1440, 390])('the working behind a number, at %i px', (width) => {
  let dashboard: Dashboard;
  beforeAll(async () => {
    dashboard = await openDashboard({ width });
    await dashboard.becomeOwner();
  });
  afterAll(() => dashboard.close());

  test('a number opens its working; a value that is a demand opens that demand’s; a value of the file says where', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'wall-line?line=1&case=EY'));
    const storeys = page.getByRole('region', { name: 'Forces into and out of every storey' });
    const overturning = storeys
      .getByRole('row', { name: /Level 3/ })
      .locator('.figure')
      .last();
    await overturning.click();
    const panel = page.getByRole('complementary', { name: 'Working' });
    await panel.getByRole('heading', { name: 'Working: overturning moment' }).waitFor();
    await panel.getByText('levels[2].elevation').waitFor();
    expect(await panel.innerText()).toContain('statics of a cantilever wall');
    await dashboard.picture(`working-${width}`);
    await panel.getByRole('link', { name: '1/L3 shear EY 1', exact: true }).click();
    await panel.getByRole('heading', { name: 'Working: shear' }).waitFor();
    await panel.getByRole('link', { name: '1/L3 reaction EY 1', exact: true }).click();
    await panel.getByText('statics of a simply supported beam').first().waitFor();
    expect(new URL(page.url()).searchParams.get('working')).toBe('1/L3 reaction EY 1');
    const wider = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(wider).toBeLessThanOrEqual(0);
    expect(dashboard.errors).toEqual([]);
  });

  test('Escape closes it and gives the focus back to the number', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'wall-line?line=1&case=EY'));
    const storeys = page.getByRole('region', { name: 'Forces into and out of every storey' });
    const figure = storeys.locator('.figure').first();
    await figure.focus();
    await page.keyboard.press('Enter');
    const panel = page.getByRole('complementary', { name: 'Working' });
    await panel.getByRole('heading', { name: /^Working: / }).waitFor();
    await page.keyboard.press('Escape');
    await panel.waitFor({ state: 'detached' });
    expect(await figure.evaluate((element) => element === document.activeElement)).toBe(true);
  });

  test('a link to a demand that is not there says so', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, `wall-line?line=1&working=${encodeURIComponent('1/L9 shear EY 1')}`));
    await page.getByRole('complementary', { name: 'Working' }).getByText('no demand of member 1/L9').waitFor();
  });
});
