import { BootstrapError } from './BootstrapError';
import type { Cleanup } from './cleanup';
import { runQuietly } from './runQuietly';
import { EXPO, EXPO_QUIET } from './webExport';

/** Writes the types of the client's addresses (`.expo/types`), which the type check needs. */
export async function ensureTypedRoutes(root: string, cleanup: Cleanup): Promise<void> {
  const { code, said } = await runQuietly(
    process.execPath,
    [EXPO, 'customize', 'tsconfig.json'],
    { cwd: root, env: { ...process.env, ...EXPO_QUIET } },
    cleanup,
  );
  if (code !== 0)
    throw new BootstrapError(`The types of the addresses could not be written:\n${said.trim()}`);
}
