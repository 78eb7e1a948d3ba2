import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { addressOf, readEnv, SettingsError } from '../../../server/env';

const DATA_DIR = mkdtempSync(path.join(os.tmpdir(), 'spate-env-'));
afterAll(() => rmSync(DATA_DIR, { recursive: true }));
const read = (settings: Record<string, string> = {}) =>
  readEnv({ DATABASE_URL: 'mariadb://u:p@127.0.0.1:1/spate', DATA_DIR, ...settings });

test('left alone, the product is for this machine, and keeps its mail as files', () => {
  const env = read();
  expect(env).toMatchObject({ host: '127.0.0.1', port: 8080, smtpUrl: null, trustProxy: 0 });
  expect(env.publicUrl).toBe('http://127.0.0.1:8080');
  expect(env.mailDir).toBe(path.join(DATA_DIR, 'mail'));
});

test.each([
  ['http://localhost:8081', 'http://localhost:8081'],
  ['https://spate.firm.example/', 'https://spate.firm.example'],
])('links in mail begin with %s', (given, publicUrl) => {
  expect(read({ PUBLIC_URL: given }).publicUrl).toBe(publicUrl);
});

test.each([
  ['PUBLIC_URL', 'spate.firm.example'],
  ['PUBLIC_URL', 'javascript:alert(1)'],
  ['PORT', '70000'],
  ['DATABASE_URL', 'postgres://u@h/d'],
  ['SMTP_URL', 'mail.firm.example'],
  ['TRUST_PROXY', '-1'],
])('%s cannot be %s', (name, value) => {
  expect(() => read({ [name]: value })).toThrow(SettingsError);
  expect(() => read({ [name]: value })).toThrow(name);
});

test('secrets are made once', () => {
  const { secrets } = read();
  expect(secrets.accessTokenKey.length).toBeGreaterThan(40);
  expect(read().secrets).toEqual(secrets);
});

test('an address that a browser on this machine opens', () => {
  expect(addressOf('0.0.0.0', 80)).toBe('http://localhost:80');
  expect(addressOf('::1', 80)).toBe('http://[::1]:80');
});
