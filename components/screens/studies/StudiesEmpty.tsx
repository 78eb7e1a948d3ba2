import type { Role } from '@/shared/accounts/roles';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { studiesWords } from './studiesWords';

export function StudiesEmpty({ roles }: { roles: readonly Role[] }) {
  if (studiesWords(roles).mayCreate) {
    return (
      <Empty
        title="No studies yet"
        action={<Button kind="solid" label="New study" href="/studies/new" />}
      >
        A study holds one question: a surveyed reach, the floods routed down it, and what came of
        them. Make the first one, then hand in its cross-sections.
      </Empty>
    );
  }
  if (roles.includes('surveyor')) {
    return (
      <Empty title="No reach is assigned to you yet">
        The engineer in charge shares a study with you; from then on it stands here and you can hand
        in its cross-sections. Ask them to share it with the e-mail address of this account.
      </Empty>
    );
  }
  return (
    <Empty title="Nothing is shared with you yet">
      As soon as your consultant shares a study with the e-mail address of this account it stands
      here. Nothing more is needed from you.
    </Empty>
  );
}
