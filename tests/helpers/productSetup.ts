import { spawn } from 'node:child_process';
import { mkdtempSync, mkdirSync, openSync } from 'node:fs';
import path from 'node:path';
import { freePort } from '../../server/bootstrap/freePort';

/**
 * Starts the whole product as `npm start` does, on its own data directory and port, with the demo data.
 * With SPATE_E2E_URL the browser tests visit a product that runs already.
 */
export default async function productSetup(): Promise<void> {
  if (process.env.SPATE_E2E_URL) return;
  const root = path.resolve(__dirname, '../..');
  mkdirSync(path.join(root, '.data-test'), { recursive: true });
  const dataDir = mkdtempSync(path.join(root, '.data-test/e2e-'));
  const port = await freePort();
  const log = openSync(path.join(dataDir, 'product.log'), 'w');
  const product = spawn('node', ['server/bootstrap/start.js'], {
    cwd: root,
    detached: true,
    stdio: ['ignore', log, log],
    env: { ...process.env, PORT: String(port), HOST: '127.0.0.1', DATA_DIR: dataDir },
  });
  const url = `http://127.0.0.1:${port}`;
  process.env.SPATE_E2E_URL = url;
  process.env.SPATE_E2E_DATA_DIR = dataDir;
  process.env.SPATE_E2E_PID = String(product.pid);
  let exited: number | null = null;
  product.on('exit', (code) => (exited = code ?? 1));

  const deadline = Date.now() + 300_000;
  while (!(await serves(url))) {
    if (exited !== null)
      throw new Error(`The product ended with ${exited}; see ${dataDir}/product.log`);
    if (Date.now() > deadline)
      throw new Error(`The product does not serve; see ${dataDir}/product.log`);
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
}

const serves = (url: string) =>
  fetch(`${url}/api/health`).then(
    (answer) => answer.ok,
    () => false,
  );
