import { COLOURS } from '../../../components/theme/tokens';

/** The product's light colours; the ground is the paper of the printer. */
export const COLOUR = COLOURS.light;
