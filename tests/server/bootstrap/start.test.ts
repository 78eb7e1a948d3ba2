import { existsSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { freePort } from '../../../server/bootstrap/freePort';
import { startDatabase } from '../../../server/bootstrap/mariadb/startDatabase';
import { readSecrets } from '../../../server/secrets';
import { createTestDatabase } from '../../helpers/createTestDatabase';
import {
  databasesOn,
  killProducts,
  makeProductDir,
  startProduct,
} from '../../helpers/startProduct';

jest.setTimeout(180_000);

const made: ReturnType<typeof makeProductDir>[] = [];
const fresh = () => {
  const one = makeProductDir();
  made.push(one);
  return one;
};
afterAll(() => {
  killProducts();
  made.forEach(({ remove }) => remove());
});

const settingsOf = async ({ dir, web }: { dir: string; web: string }) => ({
  DATA_DIR: dir,
  WEB_DIR: web,
  PORT: String(await freePort()),
});
const health = (port: string) => fetch(`http://127.0.0.1:${port}/api/health`);

describe('a start', () => {
  const place = fresh();

  test('from nothing serves page and API, and Ctrl-C leaves nothing running', async () => {
    const settings = await settingsOf(place);
    const product = startProduct(settings);
    await product.serving;
    expect(await (await health(settings.PORT)).json()).toMatchObject({ ok: true });
    const page = await fetch(`http://127.0.0.1:${settings.PORT}/studies/12`);
    expect(await page.text()).toBe('<title>Spate</title>');
    expect(product.said()).toContain(`Spate serves on http://127.0.0.1:${settings.PORT}`);
    expect(statSync(path.join(place.dir, 'secrets.json')).mode & 0o777).toBe(0o600);
    expect(databasesOn(place.dir)).toHaveLength(1);

    product.process.kill('SIGINT');
    expect(await product.ended).toBe(0);
    expect(databasesOn(place.dir)).toEqual([]);
    expect(existsSync(path.join(place.dir, 'spate.pid'))).toBe(false);
  });

  test('that is interrupted before it serves leaves nothing running', async () => {
    const product = startProduct(await settingsOf(place));
    while (databasesOn(place.dir).length === 0 && product.process.exitCode === null)
      await new Promise((resolve) => setTimeout(resolve, 20));
    product.process.kill('SIGINT');
    expect(await product.ended).toBe(0);
    expect(product.said()).not.toContain('serves on');
    expect(databasesOn(place.dir)).toEqual([]);
  });

  test('goes on with its data after it was killed: the database that was left is taken over', async () => {
    const settings = await settingsOf(place);
    const killed = startProduct(settings);
    await killed.serving;
    killed.process.kill('SIGKILL');
    await killed.ended;
    const left = databasesOn(place.dir);
    expect(left).toHaveLength(1);
    const next = startProduct(settings);
    await next.serving;
    expect(databasesOn(place.dir)).toEqual(left);
    next.process.kill('SIGTERM');
    expect(await next.ended).toBe(0);
    expect(databasesOn(place.dir)).toEqual([]);
  });

  test('recovers when the database was killed with it', async () => {
    const settings = await settingsOf(place);
    const killed = startProduct(settings);
    await killed.serving;
    killed.process.kill('SIGKILL');
    for (const pid of databasesOn(place.dir)) process.kill(pid, 'SIGKILL');
    await killed.ended;
    const next = startProduct(settings);
    await next.serving;
    expect((await health(settings.PORT)).status).toBe(200);
    next.process.kill('SIGINT');
    expect(await next.ended).toBe(0);
  });
});

test('two products run side by side, but not two on one directory or one port', async () => {
  const [first, second] = [fresh(), fresh()];
  const [one, two] = [await settingsOf(first), await settingsOf(second)];
  const products = [startProduct(one), startProduct(two)];
  await Promise.all(products.map(({ serving }) => serving));
  expect((await health(one.PORT)).status).toBe(200);
  expect((await health(two.PORT)).status).toBe(200);

  const sameDir = startProduct({ ...one, PORT: String(await freePort()) });
  expect(await sameDir.refused()).toContain(`Spate runs on ${first.dir} already`);

  const samePort = startProduct({ ...two, DATA_DIR: fresh().dir, PORT: one.PORT });
  expect(await samePort.refused()).toContain(`Port ${one.PORT} is busy`);

  for (const { process: child } of products) child.kill('SIGINT');
  expect(await Promise.all(products.map(({ ended }) => ended))).toEqual([0, 0]);
});

test('a directory of a newer version is refused and left as it is', async () => {
  const place = fresh();
  const settings = await settingsOf(place);
  const product = startProduct(settings);
  await product.serving;
  product.process.kill('SIGINT');
  await product.ended;

  const { databasePassword } = readSecrets(place.dir);
  const database = await startDatabase({ dir: place.dir, password: databasePassword });
  database.sql("INSERT INTO spate.schema_steps (name) VALUES ('999-of-the-future')");
  await database.stop();
  const older = startProduct(settings);
  expect(await older.refused()).toContain(
    'written by a newer version of Spate (it has 999-of-the-future)',
  );
  expect(databasesOn(place.dir)).toEqual([]);

  writeFileSync(path.join(place.dir, 'mysql/mariadb_upgrade_info'), '99.1.2-MariaDB');
  const olderMariaDb = startProduct(settings);
  expect(await olderMariaDb.refused()).toContain('was written by MariaDB 99.1');
});

test('DATABASE_URL uses the database that is named, and starts none', async () => {
  const place = fresh();
  const database = await createTestDatabase();
  const settings = { ...(await settingsOf(place)), DATABASE_URL: database.url };
  const product = startProduct(settings);
  await product.serving;
  expect((await health(settings.PORT)).status).toBe(200);
  expect(existsSync(path.join(place.dir, 'mysql'))).toBe(false);
  product.process.kill('SIGINT');
  expect(await product.ended).toBe(0);
  await database.drop();

  const gone = startProduct(settings);
  expect(await gone.refused()).toContain('DATABASE_URL');
});

test('settings and directories that cannot be used are named', async () => {
  const place = fresh();
  const settings = await settingsOf(place);
  const bad = startProduct({ ...settings, PORT: 'eighty', SMTP_URL: 'mail.firm.example' });
  expect(await bad.refused()).toMatch(/PORT .*\n\s*SMTP_URL must begin with smtp/);

  const file = path.join(place.web, 'index.html');
  const noDir = startProduct({ ...settings, DATA_DIR: path.join(file, 'data') });
  expect(await noDir.refused()).toContain('may not write there');
  expect(noDir.said()).not.toContain('    at ');
});
