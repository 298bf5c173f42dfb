import type { ServerResponse } from 'node:http';
import { pageHeaders } from '../bridge/contentPolicy';
import type { Notices } from '../bridge/contract';

const PULSE_ms = 15_000;
const MAX_STREAMS = 8;

export interface NoticeStreams {
  /** Keeps the answer open and writes notices to it; false when too many are open. */
  readonly add: (response: ServerResponse) => boolean;
  readonly notify: <N extends keyof Notices>(notice: N, ...payload: Parameters<Notices[N]>) => void;
  readonly count: () => number;
  readonly close: () => void;
}

/** Notices to the page, as server-sent events. An open stream also tells that a page is there. */
export function createNoticeStreams(onChange: (count: number) => void): NoticeStreams {
  const streams = new Set<ServerResponse>();
  /** Notices from before the page listened. */
  const waiting: string[] = [];
  const pulse = setInterval(() => {
    for (const stream of streams) stream.write(': here\n\n');
  }, PULSE_ms);
  pulse.unref();
  return {
    add: (response) => {
      if (streams.size >= MAX_STREAMS) return false;
      response.writeHead(200, { ...pageHeaders, 'Content-Type': 'text/event-stream' });
      response.write('retry: 1000\n\n');
      for (const text of waiting.splice(0)) response.write(text);
      streams.add(response);
      onChange(streams.size);
      response.on('close', () => {
        streams.delete(response);
        onChange(streams.size);
      });
      return true;
    },
    notify: (notice, ...payload) => {
      // JSON has no line end in it, so one data line is enough.
      const text = `event: ${notice}\ndata: ${JSON.stringify(payload)}\n\n`;
      if (streams.size === 0) waiting.push(text);
      for (const stream of streams) stream.write(text);
    },
    count: () => streams.size,
    close: () => {
      clearInterval(pulse);
      for (const stream of streams) stream.end();
    },
  };
}
