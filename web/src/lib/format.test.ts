import { expect, test } from 'vitest';
import { count, dimension, figure, percent, quantity, scientific, withSign } from './format';

test('numbers have significant figures, a true minus and thin spaces between thousands', () => {
  expect(figure(1234.5678)).toBe('1\u2009235');
  expect(figure(-0.012345, 3)).toBe('−0.0123');
  expect(figure(9.9996, 4)).toBe('10.00');
  expect(figure(99.96, 3)).toBe('100');
  expect(figure(1e-13)).toBe('0');
  expect(figure(NaN)).toBe('–');
});

test('a quantity has its unit behind a thin space; a ratio has none', () => {
  expect(quantity(12.34, 'kN/m')).toBe('12.3\u2009kN/m');
  expect(quantity(0.925, '1')).toBe('0.925');
  expect(percent(0.2541)).toBe('25.4\u2009%');
});

test('lengths have no idle zeros', () => {
  expect(dimension(12.4, 'm')).toBe('12.4\u2009m');
  expect(dimension(6.199999999999999)).toBe('6.2');
  expect(dimension(-0.0001)).toBe('0');
  expect(dimension(1250.5, 'ft')).toBe('1\u2009250.5\u2009ft');
});

test('residuals are powers of ten', () => {
  expect(scientific(1.5875e-15)).toBe('1.6·10⁻¹⁵');
  expect(scientific(-2e12, 0)).toBe('−2·10¹²');
  expect(scientific(0)).toBe('0');
});

test('counts are whole, growth has its sign', () => {
  expect(count(14374)).toBe('14\u2009374');
  expect(withSign('3.2', 3.2)).toBe('+3.2');
  expect(withSign('−3.2', -3.2)).toBe('−3.2');
});
