import { useEffect, type RefObject } from 'react';
import type { Text } from 'react-native';

/** The browser's tab and history name the screen. */
export function useDocumentTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} · Spate`;
  }, [title]);
}

let anyScreenShown = false;

/** A change of screen takes keyboard and screen reader to its heading; the first load leaves them alone. */
export function useHeadingFocus(heading: RefObject<Text | null>): void {
  useEffect(() => {
    if (anyScreenShown) {
      const element = heading.current as unknown as HTMLElement | null;
      element?.focus({ preventScroll: true });
    }
    anyScreenShown = true;
  }, [heading]);
}
