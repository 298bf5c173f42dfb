import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { displayNameOf, fileNameOf, isPlainName, suggestedFileName } from '../../../main/files/scenarioNames';

describe('names of scenario files', () => {
  it.each(['White base', 'Weiß 2', 'a.b', 'Série (3)', 'x.sunder.json'])('takes %j', (name) => {
    expect(isPlainName(name)).toBe(true);
  });

  it.each(['', '.', '..', '../x', 'a/b', 'a\\b', 'C:x', '.hidden', 'x.', 'x ', 'nul', 'COM1.txt', 'a\0b', 'a\u202Eb'])(
    'refuses %j',
    (name) => {
      expect(isPlainName(name)).toBe(false);
    },
  );

  it('refuses a name of more than 80 letters', () => {
    expect(isPlainName('a'.repeat(80))).toBe(true);
    expect(isPlainName('a'.repeat(81))).toBe(false);
  });

  it('puts the ending once', () => {
    expect(fileNameOf('white')).toBe('white.sunder.json');
    expect(fileNameOf('white.sunder.json')).toBe('white.sunder.json');
    expect(displayNameOf('/a/b/white.sunder.json')).toBe('white');
  });

  it('makes a plain file name of any text', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        expect(isPlainName(suggestedFileName(text))).toBe(true);
      }),
      { numRuns: 2000 },
    );
    expect(suggestedFileName('../../etc/passwd')).toBe('etc passwd.sunder.json');
  });
});
