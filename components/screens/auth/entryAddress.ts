/**
 * The address that the page was opened with. The router shortens the one in the bar while the screens behind the sign-in
 * are not drawn yet, and a link to a moment of a flood must still lead there after signing in.
 */
export const entryAddress: string =
  typeof window === 'undefined' ? '/' : window.location.pathname + window.location.search;
