import { parseArgs } from 'node:util';
import { object, string, ValidationError } from 'yup';
import { BootstrapError } from '../bootstrap/BootstrapError';
import { withCleanup } from '../bootstrap/cleanup';
import { commandEnv } from '../bootstrap/commandEnv';
import { explain } from '../bootstrap/explain';
import { compose } from '../composition';
import { LIMITS } from '../../shared/limits';

const USAGE =
  'npm run firm:open -- --firm "Name of the firm" --name "First administrator" --email name@firm.example';

const schema = object({
  firm: string().trim().max(LIMITS.textShort).required('--firm is missing'),
  name: string().trim().max(LIMITS.textShort).required('--name is missing'),
  email: string().trim().lowercase().email('--email is no address').required('--email is missing'),
});

/** `npm run firm:open`: a new firm with its first administrator; prints the link that sets the password. */
void withCleanup(async (cleanup) => {
  const { firm, name, email } = given();
  const services = await compose({ ...(await commandEnv(cleanup)), workers: 0 });
  try {
    const link = await services.accounts.firms.open(firm, name, email);
    console.log(`${firm} is open. ${name} sets a password within the hour at\n${link}`);
  } finally {
    await services.close();
  }
  await cleanup.run();
}, explain);

function given() {
  try {
    const text = { type: 'string' } as const;
    const { values } = parseArgs({ options: { firm: text, name: text, email: text } });
    return schema.validateSync(values, { abortEarly: false });
  } catch (error) {
    const faults = error instanceof ValidationError ? error.errors : [(error as Error).message];
    throw new BootstrapError(`${faults.join('\n')}\n\n  ${USAGE}`);
  }
}
