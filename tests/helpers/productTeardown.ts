import { rmSync } from 'node:fs';

/** Stops the product as Ctrl-C does, and waits until it is gone; what it stored goes with it. */
export default async function productTeardown(): Promise<void> {
  const pid = Number(process.env.SPATE_E2E_PID);
  if (!pid) return;
  process.kill(pid, 'SIGINT');
  const deadline = Date.now() + 20_000;
  while (alive(pid)) {
    if (Date.now() > deadline) {
      process.kill(-pid, 'SIGKILL');
      throw new Error('The product did not stop within 20 s of SIGINT.');
    }
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  if (!process.env.SPATE_E2E_KEEP) {
    rmSync(process.env.SPATE_E2E_DATA_DIR!, { recursive: true, force: true });
  }
}

function alive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}
