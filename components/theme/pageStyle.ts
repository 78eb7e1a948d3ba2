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
}
${PRINT}`;
}

/** On paper a screen is as long as it is: nothing scrolls, and what is pressed or navigated by is left out. */
const PRINT = `
@media print {
  *:has([role="main"]), [role="main"], [role="main"] > div:first-child {
    display: block !important; position: static !important; height: auto !important; max-height: none !important;
    overflow: visible !important; flex: none !important; background: none !important;
  }
  html { background: none; }
  [role="navigation"]:not([role="main"] *), [role="main"] > div:not(:first-child), [role="button"] { display: none !important; }
  [role="main"] [role="region"], [role="note"], tr { break-inside: avoid; }
  * { print-color-adjust: exact; -webkit-print-color-adjust: exact; }
}`;
