import { QueryClientProvider } from '@tanstack/react-query';
import { Slot } from 'expo-router';
import { useState } from 'react';
import { createQueryClient } from '@/components/queries/queryClient';
import { SessionProvider } from '@/components/queries/SessionProvider';
import { useFonts } from '@/components/theme/useFonts';
import { ThemeProvider } from '@/components/theme/useTheme';

/** What every screen stands in; nothing is painted before the type is there. */
export default function RootLayout() {
  const [queryClient] = useState(createQueryClient);
  const fontsReady = useFonts();
  return (
    <ThemeProvider>
      <QueryClientProvider client={queryClient}>
        <SessionProvider>{fontsReady ? <Slot /> : null}</SessionProvider>
      </QueryClientProvider>
    </ThemeProvider>
  );
}
