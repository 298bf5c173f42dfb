import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fileNameOf } from '../../../renderer/state/fileActions';

describe('fileNameOf', () => {
  it.each([
    ['White base: which medium?', 'White base which medium.sunder.json'],
    ['.../etc/passwd.', 'etc passwd.sunder.json'],
    ['', 'Scenario.sunder.json'],
    ['Farbe für Übersee', 'Farbe für Übersee.sunder.json'],
  ])('%j becomes %j', (title, name) => {
    expect(fileNameOf(title)).toBe(name);
  });

  it('never holds what a path is made of', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (title) => {
        const name = fileNameOf(title);
        expect(name).not.toMatch(/[/\\:*?"<>|\p{Cc}]/u);
        expect(name.startsWith('.')).toBe(false);
      }),
    );
  });
});
