import { createServer, type AddressInfo } from 'node:net';

/** A port that nobody listens on now. */
export const freePort = (host = '127.0.0.1'): Promise<number> => listenOn(0, host);

/** Can it be listened on? Rejects with what the system says, e.g. EADDRINUSE. */
export const listenOn = (port: number, host: string): Promise<number> =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(port, host, () => {
      const { port: given } = probe.address() as AddressInfo;
      probe.close(() => resolve(given));
    });
  });
