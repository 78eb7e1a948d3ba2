/** Things to undo at the end, latest first, each once. */
export function buildCleanup() {
  const steps: (() => Promise<void> | void)[] = [];
  let running: Promise<void> | null = null;

  async function undo(): Promise<void> {
    for (let step = steps.pop(); step; step = steps.pop()) {
      try {
        await step();
      } catch (error) {
        console.error(error);
      }
    }
  }
  const add = (step: () => Promise<void> | void) => void steps.push(step);

  /** Something that is starting will be stopped, even where the end comes before it has started. */
  function stopLater<T extends { stop: () => Promise<void> }>(starting: Promise<T>): Promise<T> {
    add(async () => {
      const started = await starting.catch(() => null);
      await started?.stop();
    });
    return starting;
  }
  return {
    add,
    stopLater,
    run: (): Promise<void> => (running ??= undo()),
  };
}

export type Cleanup = ReturnType<typeof buildCleanup>;

/** Signals that ask to end. A second one while ending is not heard: ending takes seconds. */
const SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'] as const;

/**
 * Runs a command of the product: undoes everything on a signal and on an error, which is explained where it can be.
 * Answers when the command has begun; the process goes on for as long as something runs.
 */
export async function withCleanup(
  command: (cleanup: Cleanup) => Promise<void>,
  explain: (error: unknown) => string | null,
): Promise<void> {
  const cleanup = buildCleanup();
  const end = (code: number) => void cleanup.run().then(() => process.exit(code));
  const fail = (error: unknown) => {
    console.error(`\n${explain(error) ?? (error instanceof Error ? error.stack : String(error))}`);
    end(1);
  };
  let stopping = false;
  for (const signal of SIGNALS)
    process.on(signal, () => {
      if (stopping) return;
      stopping = true;
      console.log('\nStopping …');
      end(0);
    });
  process.on('uncaughtException', fail);
  process.on('unhandledRejection', fail);
  try {
    await command(cleanup);
  } catch (error) {
    if (!stopping) fail(error);
  }
}
