import { afterEach, expect, test } from 'vitest';
import { EngineService } from '../../api/dist/engine/engine.service.js';
import { demoFile } from './service.js';

let engine: EngineService;
afterEach(() => engine.onModuleDestroy());

const text = demoFile('1-first-design');

test('many buildings are analysed on threads of their own while the service goes on', async () => {
  engine = new EngineService();
  let turns = 0;
  const turn = setInterval(() => (turns += 1), 1);
  const answers = await Promise.all(Array.from({ length: 8 }, () => engine.run('check', { text })));
  clearInterval(turn);
  expect(answers.every((answer) => answer.ok)).toBe(true);
  expect(turns).toBeGreaterThan(8);
});

test('a building at fault gets its faults, and the next one is served by the same threads', async () => {
  engine = new EngineService();
  const broken = await engine.run('check', { text: '{ "levels": 3' });
  expect(broken.ok).toBe(false);
  const sound = await engine.run('check', { document: JSON.parse(text) as unknown });
  expect(sound.ok).toBe(true);
});

test('a task that breaks its thread fails alone', async () => {
  engine = new EngineService();
  // Not a task: the thread finds nothing to call, and says so.
  const run = engine.run.bind(engine) as unknown as (name: string, input: unknown) => Promise<unknown>;
  await expect(run('nothing', {})).rejects.toThrow();
  expect((await engine.run('check', { text })).ok).toBe(true);
});

test('what still waits when the service ends is told so', async () => {
  engine = new EngineService();
  const asked = Array.from({ length: 6 }, () => engine.run('check', { text }));
  const settled = Promise.allSettled(asked);
  await engine.onModuleDestroy();
  const answers = await settled;
  expect(answers.some(({ status }) => status === 'rejected')).toBe(true);
  expect(() => engine.run('check', { text })).toThrow('too much to do');
});
