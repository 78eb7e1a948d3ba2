import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { ROLE_NAMES } from '@/shared/accounts/roles';
import type { StudyMember } from '@/shared/studies/types';
import { useMembers, useUnshareStudy } from '@/components/queries/members';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { OpenInvitations } from './OpenInvitations';
import { ShareDialog } from './ShareDialog';

/** Surveyors and clients of the study; engineers of the firm see it anyway. */
export function MembersCard({ studyId }: { studyId: number }) {
  const { data: members, error, refetch } = useMembers(studyId);
  const unshare = useUnshareStudy(studyId);
  const [isSharing, setIsSharing] = useState(false);
  const [leaving, setLeaving] = useState<StudyMember | null>(null);
  return (
    <Card title="Shared with">
      {error ? (
        <ErrorState error={error} title="This could not be read" retry={() => void refetch()} />
      ) : null}
      {!members && !error ? <Loading what="Reading who sees the study…" /> : null}
      {members?.length === 0 ? (
        <Txt tone="soft">
          Nobody outside the engineers of the firm. Share it with the surveyor who hands in the
          cross-sections, and with the client who reads what is issued.
        </Txt>
      ) : null}
      {members?.length ? (
        <List label="Shared with">
          {members.map((member) => (
            <View key={member.userId} style={styles.member}>
              <View style={styles.names}>
                <Txt strong>{member.name}</Txt>
                <Txt variant="small" tone="soft">
                  {`${ROLE_NAMES[member.as]} · ${member.email}`}
                </Txt>
              </View>
              <Button
                kind="quiet"
                label="Remove"
                name={`Remove ${member.name}`}
                onPress={() => setLeaving(member)}
              />
            </View>
          ))}
        </List>
      ) : null}
      <OpenInvitations studyId={studyId} />
      <Button label="Share the study" onPress={() => setIsSharing(true)} />
      {isSharing && members ? (
        <ShareDialog studyId={studyId} members={members} onClose={() => setIsSharing(false)} />
      ) : null}
      {leaving ? (
        <ConfirmDialog
          title={`Remove ${leaving.name}?`}
          confirm="Remove"
          onClose={() => setLeaving(null)}
          onConfirm={() => unshare.mutateAsync(leaving.userId)}
        >
          The study disappears from their list at once. Files they handed in stay.
        </ConfirmDialog>
      ) : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  member: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'center',
    gap: space.one,
  },
  names: { flex: 1, minWidth: 0 },
});
