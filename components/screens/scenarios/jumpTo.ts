import { anchorOf } from './faultPlaces';

/** Brings the place of a fault into view and puts the keyboard into its first control. */
export function jumpTo(path: string): void {
  const place = document.getElementById(anchorOf(path));
  place?.scrollIntoView({ block: 'center' });
  place
    ?.querySelector<HTMLElement>('input, select, textarea, button, [role="button"]')
    ?.focus({ preventScroll: true });
}
