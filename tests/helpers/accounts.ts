import { DEMO_ACCOUNTS } from '../../seed/accounts';

export const emailOf = (name: string): string =>
  DEMO_ACCOUNTS.find((account) => account.name === name)!.email;
