import type { GeometryChange } from '@/shared/reaches/edit/geometryChange';

/** What was changed and not saved, kept for the browser tab: leaving the page by any way loses nothing. */
export interface KeptGeometry {
  /** Version of the geometry that the change began from. */
  version: number;
  change: GeometryChange;
  /** What was done, in words. */
  steps: string[];
}

const keyOf = (reachId: number): string => `spate.geometry.${reachId}`;

export function keepGeometry(reachId: number, kept: KeptGeometry): void {
  try {
    globalThis.sessionStorage?.setItem(keyOf(reachId), JSON.stringify(kept));
  } catch {
    // Storage full or switched off: the question on closing the page still stands.
  }
}

export function keptGeometry(reachId: number): KeptGeometry | null {
  try {
    const text = globalThis.sessionStorage?.getItem(keyOf(reachId));
    return text ? (JSON.parse(text) as KeptGeometry) : null;
  } catch {
    return null;
  }
}

export function dropGeometry(reachId: number): void {
  try {
    globalThis.sessionStorage?.removeItem(keyOf(reachId));
  } catch {
    // Nothing was kept where storage is switched off.
  }
}
