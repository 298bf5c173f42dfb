import { describe, expect, it } from 'vitest';
import { readArguments } from '../../../main/commandLine/arguments';

describe('readArguments', () => {
  it('takes a file and its options in any order', () => {
    expect(readArguments(['--format', 'json', 'a.json', '--curves', '--formulation', 'Water'])).toEqual({
      file: 'a.json',
      format: 'json',
      formulation: 'Water',
      curves: true,
    });
  });

  it.each([
    [[], 'Which file?'],
    [['a', 'b'], 'One file at a time.'],
    [['a', '--format', 'xml'], '--format takes json, table, csv.'],
    [['a', '--format'], '--format takes json, table, csv.'],
    [['a', '--formulation'], '--formulation takes the name of a formulation.'],
    [['a', '--curves'], '--curves goes with --format json.'],
    [['a', '--loud'], '--loud is not known here.'],
  ])('%j: %s', (words, complaint) => {
    expect(readArguments(words)).toBe(complaint);
  });
});
