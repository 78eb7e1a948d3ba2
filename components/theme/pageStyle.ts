import { COLOURS, type Scheme } from './tokens';

/** What React Native styles cannot say: the ground behind the application, the focus ring, motion. */
export function pageStyle(scheme: Scheme): string {
  const { paper, ink, waterTint } = COLOURS[scheme];
  return `
html { color-scheme: ${scheme}; background: ${paper}; }
body { background: ${paper}; color: ${ink}; }
:focus-visible { outline: 3px solid ${ink} !important; outline-offset: 2px; }
:focus:not(:focus-visible) { outline: none; }
[data-spate-heading]:focus-visible { outline: none !important; }
::selection { background: ${waterTint}; }
@media (prefers-reduced-motion: reduce) {
  *, *::before, *::after { animation-duration: 0.01ms !important; transition-duration: 0.01ms !important; }
}`;
}
