import workerAddress from './evaluate.worker?worker&url';
import type { WorkerLike } from './evaluator';

interface TrustedTypes {
  createPolicy(
    name: string,
    rules: { createScriptURL: (address: string) => string },
  ): {
    createScriptURL(address: string): URL;
  };
}

/** The page's content policy lets only addresses through that this policy has passed: the worker's, and no other. */
const policy = (globalThis as { trustedTypes?: TrustedTypes }).trustedTypes?.createPolicy('app', {
  createScriptURL: (address) => {
    if (address !== workerAddress) throw new TypeError(`Not a script of this program: ${address}`);
    return address;
  },
});

export function startWorker(): WorkerLike {
  const address = policy?.createScriptURL(workerAddress) ?? workerAddress;
  return new Worker(address, { type: 'module' }) as WorkerLike;
}
