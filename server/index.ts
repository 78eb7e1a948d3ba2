import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { buildApp } from './app';
import { compose, type Services } from './composition';
import { seedChecks, seedConfidence, seedDemo } from '../seed';
import { addressOf, readEnv, type Env } from './env';

export interface RunningServer {
  services: Services;
  /** What a browser on this machine opens. */
  url: string;
  /** Lets answers under way finish for a moment, then stops HTTP, workers and the connection to the database. */
  stop: () => Promise<void>;
}

const SWEEP_MS = 6 * 3600 * 1000;
const LAST_ANSWERS_MS = 2000;

/** Starts HTTP and workers. Rejects with what the system says when the port cannot be listened on. */
export async function startServer(env: Env): Promise<RunningServer> {
  const services = await compose(env);
  try {
    if (env.demoData) await seedDemo(services);
    const http = await listen(services);
    services.runs.start();
    services.tasks.start();
    if (env.demoData) {
      services.background.run('checking the demo runs', () => seedChecks(services));
      services.background.run('asking for the demo sets', () => seedConfidence(services));
    }
    const sweep = () => services.background.run('sweeping', services.accounts.sweep);
    sweep();
    const sweeping = setInterval(sweep, SWEEP_MS);
    sweeping.unref();
    return {
      services,
      url: addressOf(env.host, (http.address() as AddressInfo).port),
      stop: async () => {
        clearInterval(sweeping);
        await hangUp(http);
        await services.close();
      },
    };
  } catch (error) {
    await services.close();
    throw error;
  }
}

const listen = (services: Services): Promise<Server> =>
  new Promise((resolve, reject) => {
    const { host, port } = services.env;
    const http = buildApp(services).listen(port, host, (error?: Error) =>
      error ? reject(error) : resolve(http),
    );
  });

function hangUp(http: Server): Promise<void> {
  const cut = setTimeout(() => http.closeAllConnections(), LAST_ANSWERS_MS);
  return new Promise((resolve) => {
    http.close(() => {
      clearTimeout(cut);
      resolve();
    });
    http.closeIdleConnections();
  });
}

/** `tsx server/index.ts`: the server alone, with a database that is there (`DATABASE_URL`). */
async function main(): Promise<void> {
  const running = await startServer(readEnv());
  running.services.log.info(`serving on ${running.url}`);
  for (const signal of ['SIGINT', 'SIGTERM'] as const)
    process.once(signal, () => void running.stop().then(() => process.exit(0)));
}

if (require.main === module)
  main().catch((error: unknown) => {
    console.error(error);
    process.exit(1);
  });
