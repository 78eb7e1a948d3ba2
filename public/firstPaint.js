// Runs before the first paint: dark from the start where the person or the device wants it (components/theme/themeChoice.ts).
(function () {
  var choice = null;
  try {
    choice = localStorage.getItem('spate.theme');
  } catch (closed) {
    // Storage is closed in some private windows.
  }
  var dark = matchMedia('(prefers-color-scheme: dark)').matches;
  if (choice === 'dark' || (choice !== 'light' && dark))
    document.documentElement.classList.add('dark');
})();
