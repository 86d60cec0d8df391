import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { mutated, randomFrom } from './mutate.js';
import { smallBuildings } from './small-buildings.js';
import { soundAnswer } from './sound.js';

const SEED = 90_003;
const COUNT = 10_000;

const folder = new URL('../buildings/', import.meta.url);
const written = readdirSync(folder).map((name) =>
  JSON.stringify(JSON.parse(readFileSync(new URL(name, folder), 'utf8'))),
);

test(`${COUNT} damaged building files, seed ${SEED}: a list of faults or a sound analysis, never a crash`, () => {
  const random = randomFrom(SEED);
  const made = smallBuildings(SEED, 200, ['flexible', 'rigid', 'semi-rigid']).map((building) =>
    JSON.stringify(building),
  );
  const files = [...written, ...made];
  const answers = { unread: 0, refused: 0, analysed: 0 };
  for (let i = 0; i < COUNT; i++) {
    const text = mutated(files[Math.floor(random() * files.length)] as string, random);
    answers[soundAnswer(text, 1)] += 1;
  }
  // Damage that nothing notices would try nothing.
  expect(answers.unread).toBeGreaterThan(COUNT / 4);
  expect(answers.analysed).toBeGreaterThan(COUNT / 20);
}, 600_000);
