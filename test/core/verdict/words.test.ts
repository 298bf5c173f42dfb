import { describe, expect, it } from 'vitest';
import { number, timeSpan } from '../../../core/verdict/words';

describe('timeSpan', () => {
  it.each([
    [-4, 'less than a millisecond'],
    [-2, '10 milliseconds'],
    [1, '10 seconds'],
    [Math.log10(7 * 60), '7 minutes'],
    [Math.log10(5 * 3600), '5 hours'],
    [Math.log10(12 * 86_400), '12 days'],
    [Math.log10(6 * 30.4375 * 86_400), '6 months'],
    [Math.log10(3.2 * 365.25 * 86_400), '3.2 years'],
    [400, 'more than 1000 years'],
  ])('10^%d s is "%s"', (log10Time_s, words) => {
    expect(timeSpan(log10Time_s)).toBe(words);
  });
});

describe('number', () => {
  it('writes a true minus and few digits', () => {
    expect(number(-12.3456)).toBe('−12.3');
    expect(number(123456.7)).toBe('123000');
    expect(number(1.5e9, 2)).toBe('1.5 × 10^9');
  });
});
