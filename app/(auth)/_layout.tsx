import { Redirect, Slot, useGlobalSearchParams, usePathname } from 'expo-router';
import { safeNext } from '@/components/screens/auth/safeNext';
import { useSession } from '@/components/queries/SessionProvider';

export { BrokenScreen as ErrorBoundary } from '@/components/layout/BrokenScreen';

/** Who is signed in has no business at the sign-in; one-time links work for everybody. */
export default function AuthLayout() {
  const { state } = useSession();
  const pathname = usePathname();
  const { next } = useGlobalSearchParams<{ next?: string }>();
  if (pathname === '/sign-in' && state.is === 'signedIn') return <Redirect href={safeNext(next)} />;
  return <Slot />;
}
