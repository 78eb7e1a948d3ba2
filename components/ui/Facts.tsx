import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { domTextStyle } from './textStyle';

/** Named facts, one a line; what is not known is left out. */
export function Facts({ facts }: { facts: readonly (readonly [string, string | null])[] }) {
  const { colours } = useTheme();
  return (
    <dl
      style={{
        display: 'grid',
        gridTemplateColumns: 'minmax(96px, auto) 1fr',
        columnGap: space.two,
        rowGap: space.one,
        margin: 0,
      }}
    >
      {facts
        .filter(([, value]) => value)
        .map(([name, value]) => (
          <div key={name} style={{ display: 'contents' }}>
            <dt style={domTextStyle(colours, 'body', 'soft')}>{name}</dt>
            <dd style={{ ...domTextStyle(colours), margin: 0, overflowWrap: 'anywhere' }}>
              {value}
            </dd>
          </div>
        ))}
    </dl>
  );
}
