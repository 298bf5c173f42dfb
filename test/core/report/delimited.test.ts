import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { delimited } from '../../../core/report/delimited';

describe('delimited', () => {
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '＝1'])('defuses the text %j', (text) => {
    for (const separator of [',', '\t'] as const) {
      expect(
        delimited([[text]], separator)
          .replace(/^"/, '')
          .startsWith("'"),
      ).toBe(true);
    }
  });

  it('leaves numbers as numbers, negative ones too', () => {
    expect(delimited([[-3.2, 1e-21, null, Number.POSITIVE_INFINITY]], ',')).toBe('-3.2,1e-21,,\r\n');
  });

  it('quotes what would break a row', () => {
    expect(delimited([['a "b", c', 'd\ne']], ',')).toBe('"a ""b"", c","d\ne"\r\n');
    expect(delimited([['a\tb\nc']], '\t')).toBe('a b c\n');
  });

  it('never lets a text cell begin like a formula', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const [line] = delimited([[text]], '\t').split('\n');
        expect(line).not.toMatch(/^[=+\-@]/);
      }),
    );
  });
});
