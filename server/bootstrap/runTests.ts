import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { BootstrapError } from './BootstrapError';
import { withCleanup, type Cleanup } from './cleanup';
import { ensureDebianPackages, type DebianPackage } from './debianPackages';
import { explain } from './explain';
import { stopLeftDatabases } from './leftDatabases';
import { addUp, type Outcome, type ProjectReport } from './testTotals';
import { ensureTypedRoutes } from './typedRoutes';
import { ensureWebExport } from './webExport';

const ROOT = path.resolve(__dirname, '../..');
const TEST_DATA = path.join(ROOT, '.data-test');
const JEST = path.join(ROOT, 'node_modules/jest/bin/jest.js');

/** Projects of jest.config.js in the order in which they are run, and the programs that they need. */
const PROJECTS: Record<string, DebianPackage[]> = {
  solvers: [],
  components: [],
  server: ['mariadb-server', 'poppler-utils'],
  e2e: ['mariadb-server', 'chromium', 'poppler-utils'],
};

/** Settings of a product of the user's: the tests must not find it. */
const SETTINGS =
  /^(HOST|PORT|PUBLIC_URL|DATABASE_URL|DATA_DIR|SMTP_URL|MAIL_FROM|MAIL_DIR|WEB_DIR|TRUST_PROXY|WORKERS|DEMO_DATA|LOG_LEVEL|NODE_ENV|CI)$/;

/** `npm test`, `npm test -- server e2e`. The last line tells how many passed and failed over all projects. */
export const runTests = (args: string[]): Promise<void> =>
  withCleanup((cleanup) => test(args, cleanup), explain);

async function test(args: string[], cleanup: Cleanup): Promise<void> {
  const projects = chooseProjects(args);
  ensureDebianPackages([...new Set(projects.flatMap((project) => PROJECTS[project] ?? []))]);
  await ensureTypedRoutes(ROOT, cleanup);
  if (projects.includes('e2e')) await ensureWebExport(ROOT, cleanup);
  mkdirSync(TEST_DATA, { recursive: true });
  cleanup.add(() => stopLeftDatabases(TEST_DATA));

  const outcomes: Outcome[] = [];
  for (const project of projects) outcomes.push(await runProject(project, cleanup));
  await cleanup.run();
  const { passed, failed } = addUp(outcomes);
  process.stdout.write(`\n${passed} passed, ${failed} failed\n`, () => {
    process.exit(failed === 0 && passed > 0 ? 0 : 1);
  });
}

/** All, or those that are named. */
export function chooseProjects(args: string[]): string[] {
  const all = Object.keys(PROJECTS);
  const unknown = args.filter((name) => !all.includes(name));
  if (unknown.length > 0)
    throw new BootstrapError(`Unknown: ${unknown.join(', ')}. Choose of: ${all.join(', ')}.`);
  return args.length === 0 ? all : all.filter((name) => args.includes(name));
}

async function runProject(project: string, cleanup: Cleanup): Promise<Outcome> {
  console.log(`\n${project}`);
  const report = path.join(TEST_DATA, `report-${project}-${process.pid}.json`);
  const env = Object.fromEntries(
    Object.entries(process.env).filter(([name]) => !SETTINGS.test(name)),
  );
  const jest = spawn(
    process.execPath,
    [JEST, '--selectProjects', project, '--json', '--outputFile', report],
    // Without --outputFile's twin on stdout: what people read of Jest comes on stderr.
    { cwd: ROOT, env, stdio: ['ignore', 'ignore', 'inherit'] },
  );
  cleanup.add(() => void jest.kill('SIGKILL'));
  const code = await new Promise<number | null>((resolve, reject) => {
    jest.once('error', reject);
    jest.once('close', resolve);
  });
  try {
    return { code, report: JSON.parse(readFileSync(report, 'utf8')) as ProjectReport };
  } catch {
    return { code, report: null };
  } finally {
    rmSync(report, { force: true });
  }
}
