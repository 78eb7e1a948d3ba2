// Runs before the first paint: dark from the start where the person or the device wants it (components/theme/themeChoice.ts).
(function () {
  let choice = null;
  try {
    choice = localStorage.getItem('spate.theme');
  } catch {
    // Storage is closed in some private windows.
  }
  const dark = matchMedia('(prefers-color-scheme: dark)').matches;
  if (choice === 'dark' || (choice !== 'light' && dark))
    document.documentElement.classList.add('dark');
})();
