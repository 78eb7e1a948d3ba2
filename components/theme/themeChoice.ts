/** What a person chose for light and dark; kept in the browser, for it belongs to the device. */
export const THEME_CHOICES = ['system', 'light', 'dark'] as const;
export type ThemeChoice = (typeof THEME_CHOICES)[number];

const KEY = 'spate.theme';

export function readThemeChoice(): ThemeChoice {
  try {
    const kept = localStorage.getItem(KEY);
    return THEME_CHOICES.find((choice) => choice === kept) ?? 'system';
  } catch {
    return 'system'; // storage is closed in some private windows
  }
}

export function keepThemeChoice(choice: ThemeChoice): void {
  try {
    if (choice === 'system') localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, choice);
  } catch {
    // The choice then holds until the page is closed.
  }
}
