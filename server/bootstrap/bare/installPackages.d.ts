interface Lock {
  packages: Record<string, { version?: string; optional?: boolean }>;
}
export function matches(lock: Lock, installed: Lock): boolean;
export function decideInstall(facts: {
  lockHash: string;
  stamp: string | null;
  lock: Lock;
  installed: Lock | null;
}): 'nothing' | 'stamp' | 'install';
export function installPackages(root: string): void;
