import { mkdtempSync, mkdirSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { atLeast, checkNode } from '../../../server/bootstrap/bare/checkNode';
import { decideInstall } from '../../../server/bootstrap/bare/installPackages';
import { checkRoom } from '../../../server/bootstrap/dataDirectory';
import { decidePackages, missingPackages } from '../../../server/bootstrap/debianPackages';
import { explain } from '../../../server/bootstrap/explain';
import { portTrouble } from '../../../server/bootstrap/freePort';
import { reason } from '../../../server/bootstrap/mariadb/launch';
import { socketPath } from '../../../server/bootstrap/mariadb/socketPath';
import { compareSeries, seriesOf } from '../../../server/bootstrap/mariadb/version';
import { sourceHash } from '../../../server/bootstrap/sourceHash';
import { chooseProjects } from '../../../server/bootstrap/runTests';
import { addUp } from '../../../server/bootstrap/testTotals';

describe('Node', () => {
  test.each([
    ['20.19.0', true],
    ['20.20.2', true],
    ['22.0.0', true],
    ['20.18.9', false],
    ['18.99.0', false],
  ])('%s is new enough: %s', (version, enough) => {
    expect(atLeast(version, '>=20.19')).toBe(enough);
  });

  test('an old one is named with what is needed', () => {
    expect(() => checkNode('16.1.0', '>=20.19')).toThrow('needs Node >=20.19, and this is 16.1.0');
  });
});

describe('packages of npm', () => {
  const lock = {
    packages: {
      '': {},
      'node_modules/a': { version: '1.0.0' },
      'node_modules/other-system': { version: '2.0.0', optional: true },
    },
  };
  const right = { packages: { 'node_modules/a': { version: '1.0.0' } } };
  const wrong = { packages: { 'node_modules/a': { version: '0.9.0' } } };

  test.each([
    ['none installed', { stamp: null, installed: null }, 'install'],
    ['installed by us', { stamp: 'h', installed: right }, 'nothing'],
    ['installed by hand', { stamp: null, installed: right }, 'stamp'],
    ['another version', { stamp: null, installed: wrong }, 'install'],
    ['the lock file has changed', { stamp: 'old', installed: wrong }, 'install'],
    ['one is missing', { stamp: 'old', installed: { packages: {} } }, 'install'],
    ['the stamp of packages that are gone', { stamp: 'h', installed: null }, 'install'],
  ])('%s', (_what, { stamp, installed }, decision) => {
    expect(decideInstall({ lockHash: 'h', stamp, lock, installed })).toBe(decision);
  });
});

describe('packages of Debian', () => {
  test('only what is missing is asked for', () => {
    const find = (program: string) => (program === 'chromium' ? null : `/usr/bin/${program}`);
    expect(missingPackages(['mariadb-server', 'chromium'], find)).toEqual(['chromium']);
  });

  test('root installs, others are told the command, other systems the names', () => {
    expect(decidePackages([], { isRoot: false, hasApt: false })).toBe('nothing');
    expect(decidePackages(['mariadb-server'], { isRoot: true, hasApt: true })).toBe('install');
    expect(decidePackages(['mariadb-server'], { isRoot: false, hasApt: true })).toEqual({
      message: expect.stringContaining('apt-get install --no-install-recommends mariadb-server'),
    });
    expect(decidePackages(['chromium'], { isRoot: true, hasApt: false })).toEqual({
      message: expect.stringContaining('Missing: chromium'),
    });
  });
});

describe('room on the disk', () => {
  const MB = 1024 * 1024;
  test('a new database needs more than one that is there', () => {
    expect(() => checkRoom('/data', 299 * MB, true)).toThrow('needs 300 MB free, and has 299 MB');
    expect(() => checkRoom('/data', 299 * MB, false)).not.toThrow();
    expect(() => checkRoom('/data', 63 * MB, false)).toThrow('The disk is full');
  });
});

describe('the database server', () => {
  test('its version is read from what it says', () => {
    expect(seriesOf('10.11.19-MariaDB')).toEqual([10, 11]);
    expect(seriesOf('mariadbd  Ver 11.4.2-MariaDB-deb12 for debian-linux-gnu')).toEqual([11, 4]);
    expect(seriesOf('something else')).toBeNull();
    expect(compareSeries([10, 11], [10, 6])).toBeGreaterThan(0);
    expect(compareSeries([10, 11], [11, 4])).toBeLessThan(0);
    expect(compareSeries([10, 11], [10, 11])).toBe(0);
  });

  test('its log is put into words', () => {
    expect(reason('Error 28: No space left on device')).toContain('disk is full');
    expect(reason('InnoDB: Unable to lock ./ibdata1 error: 11')).toContain('Another database');
    expect(reason('Errcode: 13 "Permission denied"')).toContain('may not be written');
    expect(reason('x\n2026 [ERROR] Something odd\ny')).toContain('Something odd');
  });

  test('its socket has a short path even where the directory has a long one', () => {
    const near = socketPath('/srv/spate');
    expect(near).toBe('/srv/spate/mysql.sock');
    const deep = `/srv/${'deep/'.repeat(30)}spate`;
    const short = socketPath(deep);
    expect(Buffer.byteLength(short)).toBeLessThanOrEqual(107);
    expect(socketPath(deep)).toBe(short);
    expect(socketPath(`${deep}2`)).not.toBe(short);
    for (const dir of [deep, `${deep}2`])
      rmSync(path.dirname(socketPath(dir)), { recursive: true });
  });
});

describe('trouble is explained', () => {
  test.each([
    ['ENOSPC', 'disk is full (/data/x)'],
    ['EDQUOT', 'disk is full'],
    ['EACCES', 'may not write there (/data/x)'],
    ['EROFS', 'DATA_DIR'],
    ['ECONNREFUSED', 'does not answer'],
    ['ER_ACCESS_DENIED_ERROR', 'refuses the user'],
    ['ER_BAD_DB_ERROR', 'does not exist'],
  ])('%s', (code, words) => {
    expect(explain(Object.assign(new Error(code), { code, path: '/data/x' }))).toContain(words);
  });

  test('as it comes from the database within other errors', () => {
    const full = Object.assign(new Error('wrapped'), { parent: { errno: 1021 } });
    expect(explain(full)).toContain('disk is full');
  });

  test('a fault of ours is not dressed up', () => {
    expect(explain(new TypeError('x is undefined'))).toBeNull();
  });

  test.each([
    ['EADDRINUSE', 'PORT=8081 npm start'],
    ['EACCES', 'only be used by root'],
    ['EADDRNOTAVAIL', 'no address 10.0.0.1'],
    ['EODD', 'EODD'],
  ])('a port: %s', (code, words) => {
    expect(portTrouble(8080, '10.0.0.1', code)).toContain(words);
  });
});

describe('the state of the sources', () => {
  test('follows names and contents, not times', () => {
    const root = mkdtempSync(path.join(os.tmpdir(), 'spate-hash-'));
    try {
      mkdirSync(path.join(root, 'app/inner'), { recursive: true });
      const file = path.join(root, 'app/inner/a.ts');
      writeFileSync(file, 'one');
      const first = sourceHash(root, ['app', 'missing']);
      utimesSync(file, 1, 1);
      expect(sourceHash(root, ['app', 'missing'])).toBe(first);
      writeFileSync(file, 'two');
      const second = sourceHash(root, ['app']);
      expect(second).not.toBe(first);
      writeFileSync(path.join(root, 'app/b.ts'), '');
      expect(sourceHash(root, ['app'])).not.toBe(second);
    } finally {
      rmSync(root, { recursive: true });
    }
  });
});

describe('the tests’ own totals', () => {
  const report = { numPassedTests: 7, numFailedTests: 0, numRuntimeErrorTestSuites: 0 };
  test('add up over projects', () => {
    const outcomes = [
      { code: 0, report },
      { code: 1, report: { ...report, numFailedTests: 2 } },
    ];
    expect(addUp(outcomes)).toEqual({ passed: 14, failed: 2 });
  });

  test('count a file that could not be run, a runner that broke and one that fell silent', () => {
    const broken = { ...report, numRuntimeErrorTestSuites: 1 };
    expect(addUp([{ code: 1, report: broken }])).toEqual({ passed: 7, failed: 1 });
    expect(addUp([{ code: 1, report }])).toEqual({ passed: 7, failed: 1 });
    expect(addUp([{ code: null, report: null }])).toEqual({ passed: 0, failed: 1 });
  });

  test('projects are run in their order, all or those named', () => {
    expect(chooseProjects([])).toEqual(['solvers', 'components', 'server', 'e2e']);
    expect(chooseProjects(['e2e', 'server'])).toEqual(['server', 'e2e']);
    expect(() => chooseProjects(['sever'])).toThrow('Choose of: solvers');
  });
});
