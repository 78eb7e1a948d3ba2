import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { ROLE_NAMES } from '@/shared/accounts/roles';
import type { InvitationRow } from '@/shared/accounts/types';
import { useResendInvitation, useWithdrawInvitation } from '@/components/queries/invitations';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { ErrorState } from '@/components/ui/ErrorState';
import { formatDay } from '@/components/ui/formatDay';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';

export function InvitationLine({ invitation }: { invitation: InvitationRow }) {
  const { id, email, roles, invitedBy, expiresAt } = invitation;
  const resend = useResendInvitation();
  const withdraw = useWithdrawInvitation();
  const [isLeaving, setIsLeaving] = useState(false);
  const [openedAt] = useState(Date.now);
  const hasRunOut = Date.parse(expiresAt) < openedAt;
  return (
    <View style={styles.line}>
      <View style={styles.row}>
        <View style={styles.names}>
          <Txt strong>{email}</Txt>
          <Txt variant="small" tone="soft">
            {`${roles.map((role) => ROLE_NAMES[role]).join(', ')} · by ${invitedBy} · ${hasRunOut ? 'ran out' : 'holds until'} ${formatDay(expiresAt)}`}
          </Txt>
          {hasRunOut ? <Badge label="Ran out" tone="ochre" /> : null}
        </View>
        <ButtonRow>
          <Button
            label="Send again"
            name={`Send the invitation to ${email} again`}
            busy={resend.isPending}
            onPress={() => resend.mutate(id)}
          />
          <Button
            kind="quiet"
            label="Withdraw"
            name={`Withdraw the invitation to ${email}`}
            onPress={() => setIsLeaving(true)}
          />
        </ButtonRow>
      </View>
      {resend.isSuccess ? (
        <Notice tone="done">Sent again; the older link no longer works.</Notice>
      ) : null}
      {resend.error ? <ErrorState error={resend.error} title="Not sent" /> : null}
      {isLeaving ? (
        <ConfirmDialog
          title="Withdraw the invitation?"
          confirm="Withdraw"
          onClose={() => setIsLeaving(false)}
          onConfirm={() => withdraw.mutateAsync(id)}
        >
          {`The link sent to ${email} stops working at once.`}
        </ConfirmDialog>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  line: { gap: space.one },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'center',
    gap: space.one,
  },
  names: { flexShrink: 1, flexGrow: 1, minWidth: 220, gap: 2 },
});
