/** Path of Electron's program, or null. */
export function electronBinary(
  environment?: Readonly<Record<string, string | undefined>>,
  folder?: string,
): string | null;

/** Runs Electron's installer; null when it succeeded, else the reason in a few words. */
export function installElectron(options?: {
  readonly script?: string;
  readonly stall_ms?: number;
  readonly limit_ms?: number;
  readonly progress?: () => number;
  readonly onProgress?: (received_bytes: number) => void;
}): Promise<string | null>;
