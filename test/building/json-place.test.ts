import fc from 'fast-check';
import { expect, test } from 'vitest';
import { jsonBreak } from '@groundward/engine/building/json-place';

const characters = '|{|}|[|]|,|:|"|\\|0|1|-|.|e|E|t|n| |\n|\u0001'.split('|');

/** JSON text with one character taken out, put in or replaced. */
const spoiled = fc
  .tuple(fc.json(), fc.nat(), fc.constantFrom(...characters), fc.boolean())
  .map(([text, at, character, replace]) => {
    const i = at % (text.length + 1);
    return text.slice(0, i) + character + text.slice(replace ? i + 1 : i);
  });

function parses(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}

test('sound JSON is read to its end', () => {
  fc.assert(fc.property(fc.json(), (text) => jsonBreak(text) === text.length));
});

test('what breaks before its end is no JSON, whatever follows; what breaks nowhere is JSON or only too short', () => {
  fc.assert(
    fc.property(spoiled, fc.string(), (text, tail) => {
      const at = jsonBreak(text);
      if (parses(text)) expect(at).toBe(text.length);
      else if (at < text.length) expect(parses(text.slice(0, at + 1) + tail)).toBe(false);
    }),
    { numRuns: 2000 },
  );
});

test('where the platform names a place, it is the same one', () => {
  fc.assert(
    fc.property(spoiled, (text) => {
      try {
        JSON.parse(text);
      } catch (error) {
        const position = /at position (\d+)/.exec(String(error))?.[1];
        if (position !== undefined) expect(jsonBreak(text)).toBe(Number(position));
      }
    }),
    { numRuns: 2000 },
  );
});
