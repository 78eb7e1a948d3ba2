import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';

/** Stands wherever a result can be read. */
export function Cautions() {
  return (
    <Notice tone="info" title="What this result is, and is not" still>
      <Txt variant="small">
        A computed flood, not a forecast and not a warning. It moves along one line: level water
        across each section, no bends, no scour or sediment, no debris, no waves, no flow that
        leaves the surveyed sections. It is as good as the survey, the roughness and the inflow it
        was given.
      </Txt>
      <Txt variant="small">
        Decisions about flood and dam safety need a licensed engineer who has checked this run, and
        the rules of the local authority.
      </Txt>
    </Notice>
  );
}
