import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createHeartbeat } from '../../../main/loopback/heartbeat';

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('the heartbeat of the loopback host', () => {
  const begun = () => {
    const onGone = vi.fn();
    return { onGone, ...createHeartbeat(30_000, onGone) };
  };

  it('waits for ever for the first page', () => {
    const { note, onGone } = begun();
    note(0);
    vi.advanceTimersByTime(3_600_000);
    expect(onGone).not.toHaveBeenCalled();
  });

  it('ends half a minute after the last page has gone', () => {
    const { note, onGone } = begun();
    note(1);
    note(2);
    note(1);
    vi.advanceTimersByTime(60_000);
    note(0);
    vi.advanceTimersByTime(29_999);
    expect(onGone).not.toHaveBeenCalled();
    vi.advanceTimersByTime(1);
    expect(onGone).toHaveBeenCalledTimes(1);
  });

  it('takes a reload for what it is', () => {
    const { note, onGone } = begun();
    note(1);
    note(0);
    vi.advanceTimersByTime(1_000);
    note(1);
    vi.advanceTimersByTime(3_600_000);
    expect(onGone).not.toHaveBeenCalled();
  });

  it('says so again after a page that came back has gone too', () => {
    const { note, onGone } = begun();
    for (const pages of [1, 0, 1, 0]) {
      note(pages);
      if (pages === 0) vi.advanceTimersByTime(30_000);
    }
    expect(onGone).toHaveBeenCalledTimes(2);
  });

  it('is silent once stopped', () => {
    const { note, stop, onGone } = begun();
    note(1);
    note(0);
    stop();
    vi.advanceTimersByTime(60_000);
    expect(onGone).not.toHaveBeenCalled();
  });
});
