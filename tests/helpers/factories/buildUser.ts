import type { Role } from '../../../shared/accounts/roles';
import { hashPassword } from '../../../server/auth/passwords';
import type { Services } from '../../../server/composition';
import type { UserModel } from '../../../server/models/User';
import { buildFirm } from './buildFirm';
import { nextNumber } from './counter';

export const PASSWORD = 'a long enough password';

let hashed: Promise<string> | undefined;

interface Given {
  firmId?: number;
  email?: string;
  name?: string;
  active?: boolean;
}

/** A user with `PASSWORD`; in a firm of their own unless `firmId` is given. */
export async function buildUser(
  services: Services,
  roles: Role[],
  given: Given = {},
): Promise<UserModel> {
  const number = nextNumber();
  hashed ??= hashPassword(PASSWORD);
  return services.models.User.create({
    firmId: given.firmId ?? (await buildFirm(services)).id,
    email: `person${number}@firm.example`,
    name: `Person ${number}`,
    passwordHash: await hashed,
    roles,
    ...given,
  });
}
