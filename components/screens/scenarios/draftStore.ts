import type { Draft } from './draft';

/** What was typed and not saved, kept for the browser tab: leaving the page by any way loses nothing. */
export interface KeptDraft {
  /** Version of the scenario that the draft began from. */
  version: number;
  draft: Draft;
}

const keyOf = (scenarioId: number): string => `spate.scenario.${scenarioId}`;

export function keepDraft(scenarioId: number, kept: KeptDraft): void {
  try {
    globalThis.sessionStorage?.setItem(keyOf(scenarioId), JSON.stringify(kept));
  } catch {
    // Storage full or switched off: the question on closing the page still stands.
  }
}

export function keptDraft(scenarioId: number): KeptDraft | null {
  try {
    const text = globalThis.sessionStorage?.getItem(keyOf(scenarioId));
    return text ? (JSON.parse(text) as KeptDraft) : null;
  } catch {
    return null;
  }
}

export function dropDraft(scenarioId: number): void {
  try {
    globalThis.sessionStorage?.removeItem(keyOf(scenarioId));
  } catch {
    // Nothing was kept where storage is switched off.
  }
}
