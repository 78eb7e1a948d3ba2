import { useState } from 'react';
import type { StudyMember } from '@/shared/studies/types';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { InviteToStudy } from './InviteToStudy';
import { ShareWithMember } from './ShareWithMember';

interface ShareDialogProps {
  studyId: number;
  members: readonly StudyMember[];
  onClose: () => void;
}

export type MemberAs = StudyMember['as'];

const AS = [
  {
    value: 'surveyor',
    label: 'Surveyor',
    hint: 'Hands in cross-sections; sees nothing else of the study.',
  },
  { value: 'client', label: 'Client', hint: 'Reads what is issued, and nothing before.' },
] as const;

/** With somebody who has an account, or by an invitation. */
export function ShareDialog({ studyId, members, onClose }: ShareDialogProps) {
  const [as, setAs] = useState<MemberAs>('surveyor');
  return (
    <Dialog
      title="Share the study"
      open
      onClose={onClose}
      actions={<Button label="Close" onPress={onClose} />}
    >
      <RadioGroup label="As" value={as} options={AS} onChange={setAs} />
      <ShareWithMember key={as} studyId={studyId} as={as} members={members} />
      <InviteToStudy studyId={studyId} as={as} />
    </Dialog>
  );
}
