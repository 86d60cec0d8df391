import { expect, test } from 'vitest';
import { smallBuildings } from './small-buildings.js';
import { soundAnswer } from './sound.js';

const SEED = 90_002;
const COUNT = 1_000;

test(`${COUNT} random buildings with semi-rigid floors among others, seed ${SEED}: analysed, certified, the same bytes twice`, () => {
  for (const [i, building] of smallBuildings(SEED, COUNT, ['semi-rigid', 'flexible', 'rigid']).entries()) {
    expect(soundAnswer(JSON.stringify(building), 2), `building ${i}`).toBe('analysed');
  }
}, 600_000);
