import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { Review } from '@/shared/review/types';
import { wallClock } from '@/components/ui/wallClock';

/** What stands between this run and its signature, or what became of it. */
export function StandingNotice({ review }: { review: Review }) {
  const { state, returnReason, obstacles, signOff, sentTo, sentAt, triesOutletOf } = review;
  if (triesOutletOf !== null)
    return (
      <Notice title="Not checked itself" still>
        {`This run only tries the outlet of run ${triesOutletOf}; what came of it stands in the checklist there.`}
      </Notice>
    );
  if (state === null) return null;
  if (state === 'returned')
    return (
      <Notice tone="attention" title="Returned to the modeller" still>
        <Txt>{returnReason ?? 'No reason was given.'}</Txt>
        <Txt variant="small">
          Answer the points and send the run again; or change the inputs, which makes a new run.
        </Txt>
      </Notice>
    );
  if (signOff?.withdrawal)
    return (
      <Notice
        tone="danger"
        title={`Signature withdrawn by ${signOff.withdrawal.by}, ${wallClock(signOff.withdrawal.at)}`}
        still
      >
        <Txt>{signOff.withdrawal.reason}</Txt>
      </Notice>
    );
  if (signOff) return null;
  const sent = `Sent ${sentAt ? wallClock(sentAt) : ''} to ${sentTo?.name ?? 'every senior engineer of the firm'}.`;
  return (
    <Notice
      tone={obstacles.length ? 'attention' : 'done'}
      title={obstacles.length ? 'Not to be signed yet' : 'Nothing is in the way of a signature'}
      still
    >
      {obstacles.map((line) => (
        <Txt key={line}>{line}</Txt>
      ))}
      <Txt variant="small">{sent}</Txt>
    </Notice>
  );
}
