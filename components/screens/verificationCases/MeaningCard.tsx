import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';

/** What a verdict is worth, and what it is not. */
export function MeaningCard() {
  return (
    <Card title="What this says">
      <Txt>
        Within bounds: on this machine, with this version, the equations are solved as closely as
        they were when the bounds were set. A fault of sign or a lost term lies far outside.
      </Txt>
      <Txt>
        It does not say that the survey, the roughness or the flood of a study are right, nor what
        one-dimensional equations leave out. That is judged by a licensed engineer, under the rules
        of the local authority.
      </Txt>
    </Card>
  );
}
