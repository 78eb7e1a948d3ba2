import { createServer, type AddressInfo } from 'node:net';
import { BootstrapError } from './BootstrapError';

/** A port of loopback that nobody listens on now. */
export const freePort = (): Promise<number> => tryPort(0, '127.0.0.1');

/** Listens for a moment; the port. Rejects with what the system says. */
const tryPort = (port: number, host: string): Promise<number> =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(port, host, () => {
      const { port: given } = probe.address() as AddressInfo;
      probe.close(() => resolve(given));
    });
  });

/** Throws `BootstrapError` where the product could not listen there. */
export async function refuseBusyPort(port: number, host: string): Promise<void> {
  try {
    await tryPort(port, host);
  } catch (error) {
    throw new BootstrapError(portTrouble(port, host, (error as NodeJS.ErrnoException).code), {
      cause: error,
    });
  }
}

export function portTrouble(port: number, host: string, code: string | undefined): string {
  switch (code) {
    case 'EADDRINUSE':
      return `Port ${port} is busy: another program (or another Spate) listens there. Stop it, or choose another port: PORT=${port + 1} npm start`;
    case 'EACCES':
      return `Port ${port} may only be used by root. Choose one from 1024 up: PORT=8080 npm start`;
    case 'EADDRNOTAVAIL':
    case 'ENOTFOUND':
      return `This machine has no address ${host}. Set HOST to one that it has; 127.0.0.1 is for this machine alone, 0.0.0.0 for every network.`;
    default:
      return `Spate cannot listen on ${host}, port ${port} (${code ?? 'unknown reason'}).`;
  }
}
