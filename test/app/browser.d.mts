type Run = (command: string, commandArguments: readonly string[], timeout_ms: number) => Promise<boolean>;

export function findInPath(name: string): string | null;
export function findBrowser(): Promise<string | null>;
export function browserArguments(): string[];
export const ranWell: Run;
export function installedByApt(name: string, run?: Run): Promise<boolean>;
export function ensureBrowser(means?: {
  readonly find?: () => Promise<string | null>;
  readonly run?: Run;
}): Promise<string>;
