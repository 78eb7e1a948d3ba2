import path from 'node:path';
import { withCleanup } from './cleanup';
import { explain } from './explain';
import { ensureWebExport } from './webExport';

/** `npm run build`: the client as the product serves it, where its sources have changed. */
export const buildWeb = (): Promise<void> =>
  withCleanup(async (cleanup) => {
    console.log(await ensureWebExport(path.resolve(__dirname, '../..'), cleanup));
  }, explain);
