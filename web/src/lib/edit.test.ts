import { expect, test } from 'vitest';
import { changed, faultsAt, jsonPath, pastedCells, setAt, typedNumber } from './edit';

const building = {
  levels: [{ id: 'L2', elevation: 3 }],
  wallLines: [
    {
      id: '1',
      axis: [
        [0, 0],
        [0, 9],
      ],
    },
  ],
};

test('one value is set and nothing else is touched, the saved document least of all', () => {
  const next = setAt(building, ['wallLines', 0, 'axis', 1, 1], 12);
  expect(next).toEqual({
    ...building,
    wallLines: [
      {
        id: '1',
        axis: [
          [0, 0],
          [0, 12],
        ],
      },
    ],
  });
  expect(building.wallLines[0]?.axis[1]).toEqual([0, 9]);
  expect((next as typeof building).levels).toBe(building.levels);
});

test('an emptied cell takes its key away', () => {
  expect(setAt(building, ['levels', 0, 'elevation'], undefined)).toEqual({ ...building, levels: [{ id: 'L2' }] });
});

test('changes of one row that are put back into it all count', () => {
  const add = (key: string) => ({ path: ['levels', 0], value: (row: unknown) => ({ ...(row as object), [key]: 1 }) });
  expect(changed(building, [add('a'), add('b')])).toMatchObject({ levels: [{ id: 'L2', a: 1, b: 1 }] });
});

test('what is typed is a number where it is one, with either decimal sign, and else stays as it is for the reader to refuse', () => {
  expect(typedNumber(' 7.5 ')).toBe(7.5);
  expect(typedNumber('7,5')).toBe(7.5);
  expect(typedNumber('−3')).toBe(-3);
  expect(typedNumber('1\u2009250')).toBe(1250);
  expect(typedNumber('')).toBeUndefined();
  expect(typedNumber('1,250,000')).toBe('1,250,000');
  expect(typedNumber('nonsense')).toBe('nonsense');
});

test('a block from a spreadsheet has rows and cells, with or without a last line end', () => {
  expect(pastedCells('1\t2\r\n3\t\r\n')).toEqual([
    ['1', '2'],
    ['3', ''],
  ]);
});

test('a fault finds its field by the path that the reader gives it', () => {
  const fault = { code: 'x', path: 'wallLines[0].axis[1][1]', found: 'text', expected: 'a number' };
  expect(jsonPath(['wallLines', 0, 'axis', 1, 1])).toBe(fault.path);
  expect(faultsAt([fault], ['wallLines', 0, 'axis'])).toEqual([fault]);
  expect(faultsAt([fault], ['wallLines', 0, 'axis', 1, 0])).toEqual([]);
});
