import { Empty } from '../ui/Empty';
import { Button } from '../ui/Button';
import { Screen } from './Screen';

/** Whatever does not exist or may not be seen: both look alike. */
export function NotThere() {
  return (
    <Screen title="Nothing here">
      <Empty
        title="There is nothing at this address"
        action={<Button label="To the studies" href="/" />}
      >
        It may have been removed, or it is not shared with you. If somebody sent you the link, ask
        them to share the study with this account.
      </Empty>
    </Screen>
  );
}
