import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { executablePath, openDashboard, paste, type Dashboard } from './dashboard.js';

let dashboard: Dashboard;

describe.skipIf(executablePath === undefined)('editing a building in the browser', () => {
  beforeAll(async () => {
    dashboard = await openDashboard();
    await dashboard.becomeOwner();
  });
  afterAll(() => dashboard.close());

  const from = () => dashboard.page.getByLabel('From of 1/L2/1a', { exact: true });
  const save = () => dashboard.page.getByRole('button', { name: 'Save and analyse' }).click();
  const version = async () => (await dashboard.revisions()).find(({ number }) => number === 3)?.version;

  test('what is at fault is told at its field and in a list that leads there; nothing is saved', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(3, 'building'));
    const before = await version();
    await from().fill('nonsense');
    await from().press('Enter');
    await save();
    const list = page.getByRole('alert').filter({ hasText: 'wallLines[0].storeys[0].piers[0].from' });
    await list.waitFor();
    expect(await from().getAttribute('aria-invalid')).toBe('true');
    expect(await page.getByRole('row', { name: /1\/L2\/1a/ }).innerText()).toContain('expected');
    await page.getByRole('link', { name: 'Forces' }).click();
    await list.getByRole('button', { name: 'go there' }).first().click();
    await expect.poll(() => from().evaluate((field) => field === document.activeElement)).toBe(true);
    expect(await version()).toBe(before);
  });

  test('a block from a spreadsheet fills the cells and makes the piers that it needs', async () => {
    const { page } = dashboard;
    await page.getByRole('button', { name: 'Drop the changes' }).click();
    const lowest = page.getByLabel('From of 1/roof/1b', { exact: true });
    await lowest.focus();
    await paste(page, [
      [6, 10],
      [11, 13],
      [14.5, 16],
    ]);
    await expect.poll(() => page.getByLabel('To of 1/roof/1b', { exact: true }).inputValue()).toBe('10');
    expect(await page.getByLabel('From of 1/roof/1c', { exact: true }).inputValue()).toBe('11');
    expect(await page.getByLabel('From of 1/roof/p4', { exact: true }).inputValue()).toBe('14.5');
    expect(await page.getByLabel('To of 1/roof/p4', { exact: true }).inputValue()).toBe('16');
  });

  test('what was typed and not saved outlives a reload', async () => {
    const { page } = dashboard;
    await page.reload();
    await page.getByRole('status').filter({ hasText: 'brought back' }).waitFor();
    expect(await page.getByLabel('To of 1/roof/p4', { exact: true }).inputValue()).toBe('16');
  });

  test('somebody else’s save in between is told, and what was typed is kept and can be saved over it', async () => {
    const { page } = dashboard;
    const revision = (await dashboard.revisions()).find(({ number }) => number === 3);
    const path = `/api/projects/${await dashboard.project()}/revisions/${revision?.id ?? ''}/building`;
    const theirs = await page.request.put(dashboard.url + path, {
      headers: { 'if-match': `"${revision?.version ?? 0}"` },
      data: { ...(await dashboard.json<object>(path)), name: 'Renamed by somebody else' },
    });
    expect(theirs.status()).toBe(200);
    await save();
    const told = page.getByRole('alert').filter({ hasText: 'Somebody else saved' });
    await told.waitFor();
    expect(await page.getByLabel('To of 1/roof/p4', { exact: true }).inputValue()).toBe('16');
    await told.getByRole('button', { name: 'Keep mine, over theirs' }).click();
    await save();
    await expect.poll(version, { timeout: 30_000 }).toBe((revision?.version ?? 0) + 2);
    const now = await dashboard.json<{ name: string; wallLines: { storeys: { piers: { id: string }[] }[] }[] }>(path);
    expect(now.name).toBe('Ropewalk Yard, House 2');
    expect(now.wallLines[0]?.storeys[3]?.piers.map(({ id }) => id)).toContain('p4');
  });

  test('a building file can be uploaded into the draft, and is downloaded as it was saved', async () => {
    const { page } = dashboard;
    await page
      .getByRole('status')
      .filter({ hasText: /^Saved/ })
      .waitFor();
    const arriving = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Download the building file' }).click();
    const file = await (await arriving).path();
    await page.getByLabel('Replace by a building file').setInputFiles({
      name: 'broken.json',
      mimeType: 'application/json',
      buffer: Buffer.from('{ not JSON'),
    });
    await page.getByRole('alert').filter({ hasText: 'broken.json is not JSON' }).waitFor();
    await page.getByLabel('Replace by a building file').setInputFiles(file);
    await page.getByRole('status').filter({ hasText: 'is in the editor' }).waitFor();
    await page.getByRole('button', { name: 'Drop the changes' }).click();
  });

  test('what the file may state beyond the tables is put in by forms: a fault leads to its field, a save keeps it', async () => {
    const { page } = dashboard;
    const before = (await version()) ?? 0;
    await page.goto(`${await dashboard.view(3, 'building')}?section=basis`);
    const field = page.getByRole('group', { name: 'Seismic', exact: true }).getByLabel('Overstrength', { exact: true });
    await field.fill('much');
    await field.press('Enter');
    await save();
    await page.getByRole('alert').filter({ hasText: 'basis.seismic.overstrength' }).waitFor();
    await page.getByRole('link', { name: 'Piers' }).click();
    await page.getByRole('alert').getByRole('button', { name: 'go there' }).first().click();
    await expect.poll(() => field.evaluate((element) => element === document.activeElement)).toBe(true);
    await field.fill('2.5');
    await field.press('Enter');
    await page
      .getByRole('group', { name: 'EX', exact: true })
      .getByRole('button', { name: 'State accidental' })
      .click();
    await page.getByRole('group', { name: 'EX', exact: true }).getByLabel('Ratio', { exact: true }).fill('0.05');
    await page.keyboard.press('Enter');
    await save();
    await expect.poll(version, { timeout: 30_000 }).toBe(before + 1);
    const revision = (await dashboard.revisions()).find(({ number }) => number === 3);
    const saved = await dashboard.json<{ loadCases: { id: string; accidental?: unknown }[]; basis: unknown }>(
      `/api/projects/${await dashboard.project()}/revisions/${revision?.id ?? ''}/building`,
    );
    expect(saved.basis).toMatchObject({ seismic: { overstrength: 2.5 } });
    expect(saved.loadCases.find(({ id }) => id === 'EX')?.accidental).toEqual({ ratio: 0.05 });
  });

  test('one member is shown in full: a floor with its outline as lines of points', async () => {
    const { page } = dashboard;
    await page.goto(`${await dashboard.view(3, 'building')}?section=member&kind=Floors+and+roofs&member=L2/L2-main`);
    const outline = page.getByLabel('Outline [m]', { exact: true }).first();
    await expect.poll(() => outline.inputValue()).toContain('30 0');
  });

  test('an issued revision is shown and cannot be typed into', async () => {
    const { page } = dashboard;
    await page.goto(await dashboard.view(1, 'building'));
    await page.getByRole('status').filter({ hasText: 'Issued' }).waitFor();
    expect(await from().getAttribute('readonly')).not.toBeNull();
    expect(await page.getByRole('button', { name: 'Save and analyse' }).count()).toBe(0);
  });

  test('no script of the dashboard failed on the way', () => {
    expect(dashboard.errors).toEqual([]);
  });
});
