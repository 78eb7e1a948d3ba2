import { DatabaseError } from 'sequelize';

/** MariaDB has rolled the whole transaction back and asks for it again. */
const ER_LOCK_DEADLOCK = 1213;
const TRIES = 4;

const isDeadlock = (error: unknown) =>
  error instanceof DatabaseError &&
  (error.parent as Error & { errno?: number }).errno === ER_LOCK_DEADLOCK;

/** Does a statement or a whole transaction again where two of them waited for each other. */
export async function retryOnDeadlock<T>(work: () => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await work();
    } catch (error) {
      if (attempt === TRIES || !isDeadlock(error)) throw error;
    }
  }
}
