import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';
import { useColorScheme } from 'react-native';
import { usePrinting } from './usePrinting';
import { pageStyle } from './pageStyle';
import { keepThemeChoice, readThemeChoice, type ThemeChoice } from './themeChoice';
import { COLOURS, type Colours, type Scheme } from './tokens';

interface Theme {
  colours: Colours;
  scheme: Scheme;
  choice: ThemeChoice;
  setChoice: (choice: ThemeChoice) => void;
}

const ThemeContext = createContext<Theme>({
  colours: COLOURS.light,
  scheme: 'light',
  choice: 'system',
  setChoice: () => undefined,
});

/** Light and dark by the system, or as the person chose; paper is light. */
export function ThemeProvider({ children }: { children: ReactNode }) {
  const system = useColorScheme();
  const [choice, setState] = useState(readThemeChoice);
  const isPrinting = usePrinting();
  const chosen: Scheme = choice === 'system' ? (system === 'dark' ? 'dark' : 'light') : choice;
  const scheme = isPrinting ? 'light' : chosen;

  useEffect(() => {
    const id = 'spate-page-style';
    const style = document.getElementById(id) ?? document.createElement('style');
    style.id = id;
    style.textContent = pageStyle(scheme);
    document.head.append(style);
  }, [scheme]);

  const theme = useMemo(
    () => ({
      colours: COLOURS[scheme],
      scheme,
      choice,
      setChoice: (next: ThemeChoice) => {
        keepThemeChoice(next);
        setState(next);
      },
    }),
    [scheme, choice],
  );
  return <ThemeContext.Provider value={theme}>{children}</ThemeContext.Provider>;
}

export const useTheme = (): Theme => useContext(ThemeContext);
