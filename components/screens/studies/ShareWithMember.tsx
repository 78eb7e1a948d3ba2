import { useState } from 'react';
import type { StudyMember } from '@/shared/studies/types';
import { useShareStudy } from '@/components/queries/members';
import { useUsers } from '@/components/queries/users';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Notice } from '@/components/ui/Notice';
import { SelectField } from '@/components/ui/SelectField';

interface ShareWithMemberProps {
  studyId: number;
  as: StudyMember['as'];
  members: readonly StudyMember[];
}

/** Chooses among the firm's people who have that role already. */
export function ShareWithMember({ studyId, as, members }: ShareWithMemberProps) {
  const { data: users } = useUsers();
  const share = useShareStudy(studyId);
  const [chosen, setChosen] = useState<string | null>(null);

  const taken = new Set(members.filter((m) => m.as === as).map((m) => m.userId));
  const free = users?.filter((u) => u.active && u.roles.includes(as) && !taken.has(u.id)) ?? [];
  if (free.length === 0 && !share.isSuccess) return null;
  return (
    <>
      {free.length > 0 ? (
        <>
          <SelectField
            label="Somebody with an account"
            value={chosen}
            placeholder="Choose a person"
            options={free.map((u) => ({ value: String(u.id), label: `${u.name}, ${u.email}` }))}
            onChange={setChosen}
          />
          <Button
            kind="solid"
            label="Share"
            disabled={chosen === null}
            busy={share.isPending}
            onPress={() =>
              share.mutate({ userId: Number(chosen), as }, { onSuccess: () => setChosen(null) })
            }
          />
        </>
      ) : null}
      {share.error ? <ErrorState error={share.error} title="Not shared" /> : null}
      {share.isSuccess ? <Notice tone="done">Shared: it stands in their list now.</Notice> : null}
    </>
  );
}
