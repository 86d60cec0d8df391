import { expect, test } from 'vitest';
import { smallBuildings } from './small-buildings.js';
import { soundAnswer } from './sound.js';

const SEED = 90_001;
const COUNT = 9_000;

test(`${COUNT} random buildings with flexible and rigid floors, seed ${SEED}: analysed, certified, the same bytes twice`, () => {
  for (const [i, building] of smallBuildings(SEED, COUNT, ['flexible', 'rigid']).entries()) {
    expect(soundAnswer(JSON.stringify(building), 2), `building ${i}`).toBe('analysed');
  }
}, 600_000);
