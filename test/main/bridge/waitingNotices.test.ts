import { describe, expect, it } from 'vitest';
import { createWaitingNotices } from '../../../main/bridge/waitingNotices';

describe('notices', () => {
  it('from before anybody listened come to the first listener, in order and once', async () => {
    const notices = createWaitingNotices<[string]>();
    notices.tell(['one']);
    notices.tell(['two']);
    const heard: string[] = [];
    notices.listen((text) => heard.push(`first ${text}`));
    notices.listen((text) => heard.push(`second ${text}`));
    await Promise.resolve();
    expect(heard).toEqual(['first one', 'first two']);
  });

  it('come to every listener until it stops', async () => {
    const notices = createWaitingNotices<[number]>();
    const heard: string[] = [];
    const same = (value: number) => heard.push(`${value}`);
    const stop = notices.listen(same);
    notices.listen(same);
    notices.tell([1]);
    stop();
    stop();
    notices.tell([2]);
    expect(heard).toEqual(['1', '1', '2']);
  });
});
