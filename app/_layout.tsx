import { QueryClientProvider } from '@tanstack/react-query';
import { Slot } from 'expo-router';
import { useState } from 'react';
import { createQueryClient } from '@/components/queries/queryClient';
import { SessionProvider, useSession } from '@/components/queries/SessionProvider';
import { Starting } from '@/components/screens/auth/Starting';
import { useFonts } from '@/components/theme/useFonts';
import { ThemeProvider } from '@/components/theme/useTheme';

/** What every screen stands in; nothing is painted before the type is there. */
export default function RootLayout() {
  const [queryClient] = useState(createQueryClient);
  const fontsReady = useFonts();
  return (
    <ThemeProvider>
      <QueryClientProvider client={queryClient}>
        <SessionProvider>{fontsReady ? <Screens /> : null}</SessionProvider>
      </QueryClientProvider>
    </ThemeProvider>
  );
}

/**
 * No screen before the server has said who is here: a layout that holds back its own screens while it waits lets the router
 * forget which of them the address names.
 */
function Screens() {
  const { state } = useSession();
  return state.is === 'starting' || state.is === 'unreachable' ? <Starting /> : <Slot />;
}
