import { useSyncExternalStore } from 'react';

let isPrinting = false;

function subscribe(listener: () => void): () => void {
  const set = (now: boolean) => () => {
    isPrinting = now;
    listener();
  };
  const before = set(true);
  const after = set(false);
  window.addEventListener('beforeprint', before);
  window.addEventListener('afterprint', after);
  return () => {
    window.removeEventListener('beforeprint', before);
    window.removeEventListener('afterprint', after);
  };
}

/** The page is being put on paper. */
export const usePrinting = (): boolean => useSyncExternalStore(subscribe, () => isPrinting);
