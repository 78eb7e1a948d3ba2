import { radius, space, touch, type Colours } from '../theme/tokens';

/** Box of whatever is filled in; 17 px letters keep a phone from zooming in. */
export const controlStyle = (colours: Colours, invalid: boolean) => ({
  minHeight: touch,
  borderWidth: invalid ? 2 : 1,
  borderStyle: 'solid' as const,
  borderColor: invalid ? colours.brick : colours.edge,
  borderRadius: radius.control,
  backgroundColor: colours.card,
  paddingLeft: space.one * 1.5,
  paddingRight: space.one * 1.5,
});
