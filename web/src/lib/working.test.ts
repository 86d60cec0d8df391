import { expect, test } from 'vitest';
import { queryOf, referenceOf, sourceOf } from './working';

test('a reference goes to the service and back, with a combination that has spaces', () => {
  const demand = {
    member: '1/L2/1a',
    quantity: 'end-tension',
    case: 'EX/+e',
    sense: -1,
    combination: 'my own 0.6 D',
  } as const;
  expect(queryOf(referenceOf(demand))).toEqual({ ...demand, sense: '-1' });
  expect(queryOf(referenceOf({ ...demand, combination: undefined }))).not.toHaveProperty('combination');
  expect(queryOf('nothing')).toBeUndefined();
});

test('a value comes from a step, a demand, the file or a default', () => {
  expect(sourceOf('V', ['R', 'V'])).toEqual({ kind: 'step', index: 1 });
  expect(sourceOf('1/L2 shear EX 1', ['V'])).toEqual({ kind: 'demand', reference: '1/L2 shear EX 1' });
  expect(sourceOf('levels[1].elevation', ['V'])).toEqual({ kind: 'file', path: 'levels[1].elevation' });
  expect(sourceOf('default basis.seismic.Ct', [])).toEqual({ kind: 'default', path: 'basis.seismic.Ct' });
});
