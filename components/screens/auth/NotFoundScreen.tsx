import { Button } from '@/components/ui/Button';
import { AuthPage } from './AuthPage';

/** An address that leads nowhere. */
export function NotFoundScreen() {
  return (
    <AuthPage
      title="Nothing at this address"
      lead="The address may be mistyped, or from an older version."
    >
      <Button kind="solid" label="To the first page" href="/" wide />
    </AuthPage>
  );
}
