import { CAUTIONS } from '../../../shared/runs/cautions';
import type { Sheet } from '../pdf/sheet';
import { list, partHeading } from '../pdf/writing';

/** What the numbers are not. */
export function cautions(sheet: Sheet): void {
  partHeading(sheet, 'Limits and cautions', 'flowing');
  list(sheet, [
    ...CAUTIONS,
    'The numbers hold for the reach as surveyed and for this one scenario. Another flood, another outlet or a changed river asks for another run.',
    'Times of arrival hang on the roughness and on the state of the river before the flood. They are no basis for leaving later.',
  ]);
}
