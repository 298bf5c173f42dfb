import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { GROUND, titleOf } from '../../../main/electron/windowLook';

describe('the look of the window before its page has drawn itself', () => {
  it('has the grounds of the page', () => {
    const tokens = readFileSync(new URL('../../../renderer/styles/tokens.css', import.meta.url), 'utf8');
    const grounds = new Set([...tokens.matchAll(/--ground:\s*(#[0-9a-f]{6})/gi)].map(([, colour]) => colour));
    expect(grounds).toEqual(new Set([GROUND.light, GROUND.dark]));
  });

  it('names the file, and marks unsaved work', () => {
    expect(titleOf('White base', false)).toBe('White base — Sunder');
    expect(titleOf('White base', true)).toBe('* White base — Sunder');
    expect(titleOf('', false)).toBe('Sunder');
  });
});
