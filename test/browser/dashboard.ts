/** The dashboard as a visitor meets it: the built pages, the real service, a database with the demo, a browser. */
import { mkdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { chromium, type Page } from 'playwright-core';
import { serve } from '../../api/dist/main.js';
import { seed } from '../../api/dist/seed.js';
import { newDatabase } from '../service/service.js';

/** Without a browser the suites are skipped; `npm test` says so, and fails for it where CI=true. */
export const executablePath = process.env['GROUNDWARD_CHROMIUM'];

const artefacts = fileURLToPath(new URL('../artefacts', import.meta.url));
const QUIET = ['--disable-background-networking', '--disable-component-update', '--disable-sync', '--no-first-run'];

export type RevisionBody = {
  readonly id: string;
  readonly number: number;
  readonly name: string;
  readonly state: string;
  readonly version: number;
};

export type Dashboard = {
  readonly url: string;
  readonly page: Page;
  readonly ownerLink: string;
  /** What scripts of the pages threw. */
  readonly errors: readonly string[];
  readonly becomeOwner: () => Promise<void>;
  /** The demo project. */
  readonly project: () => Promise<string>;
  readonly revisions: () => Promise<RevisionBody[]>;
  /** Address of a view of a revision, by the revision's number. */
  readonly view: (number: number, path: string) => Promise<string>;
  readonly json: <T>(path: string) => Promise<T>;
  /** Keeps a picture in test/artefacts. */
  readonly picture: (name: string) => Promise<void>;
  readonly close: () => Promise<void>;
};

export async function openDashboard({ width = 1440 }: { readonly width?: number } = {}): Promise<Dashboard> {
  mkdirSync(artefacts, { recursive: true });
  const database = await newDatabase();
  await seed({ databaseUrl: database.url });
  const service = await serve({
    port: 0,
    host: '127.0.0.1',
    databaseUrl: database.url,
    webDir: fileURLToPath(new URL('../../web', import.meta.url)),
  });
  const browser = await chromium.launch({
    executablePath: executablePath ?? '',
    args: ['--no-sandbox', '--disable-gpu', ...QUIET],
  });
  const page = await browser.newPage({ viewport: { width, height: 900 }, acceptDownloads: true });
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(error.message));
  const json = async <T>(path: string): Promise<T> => (await (await page.request.get(service.url + path)).json()) as T;
  const project = async (): Promise<string> => (await json<{ id: string }[]>('/api/projects'))[0]?.id ?? '';
  const revisions = async (): Promise<RevisionBody[]> => json(`/api/projects/${await project()}/revisions`);
  return {
    url: service.url,
    page,
    ownerLink: service.ownerLink ?? '',
    errors,
    json,
    project,
    revisions,
    becomeOwner: async () => {
      const token = new URL(service.ownerLink ?? '').searchParams.get('token');
      await page.request.post(`${service.url}/api/owner`, {
        data: { token, name: 'Ada Marsh', email: 'ada@example.org', password: 'a long password' },
      });
    },
    view: async (number, path) => {
      const revision = (await revisions()).find((candidate) => candidate.number === number);
      return `${service.url}/projects/${await project()}/revisions/${revision?.id ?? ''}/${path}`;
    },
    picture: async (name) => {
      await page.screenshot({ path: `${artefacts}/${name}.png` });
    },
    close: async () => {
      await browser.close();
      await service.close();
      await database.drop();
    },
  };
}

/** What a spreadsheet puts on the clipboard, pasted into the field that has the focus. */
export async function paste(page: Page, block: readonly (readonly (string | number)[])[]): Promise<void> {
  await page.evaluate(
    (text) => {
      const data = new DataTransfer();
      data.setData('text/plain', text);
      document.activeElement?.dispatchEvent(
        new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }),
      );
    },
    block.map((row) => row.join('\t')).join('\r\n'),
  );
}
