import { rmSync } from 'node:fs';
import './databaseSetup';

export default async function databaseTeardown(): Promise<void> {
  const running = globalThis.spateTestDatabase;
  if (!running) return;
  await running.database.stop();
  rmSync(running.dir, { recursive: true, force: true });
}
