import { type Result, refused } from '../../core/problem';
import { HOST_FAULT } from './handlers';

/** Runs a handler. A fault of ours is logged here once; the page hears that it happened, not where. */
export async function answer(
  request: string,
  handler: (...untrusted: unknown[]) => Promise<Result<unknown>>,
  untrusted: readonly unknown[],
): Promise<Result<unknown>> {
  try {
    return await handler(...untrusted);
  } catch (error) {
    const trace = error instanceof Error ? error.stack : String(error);
    process.stderr.write(`Fault in ${request}: ${trace}\n`);
    return refused(HOST_FAULT);
  }
}
