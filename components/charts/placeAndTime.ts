/** The chosen place (chainage, m) and time (s from start) of a study; null before one is chosen. */
export interface PlaceAndTime {
  at: number | null;
  t: number | null;
}

export interface PlaceAndTimeStore {
  get: () => PlaceAndTime;
  set: (change: Partial<PlaceAndTime>) => void;
  subscribe: (listener: () => void) => () => void;
  setAt: (at: number) => void;
  setT: (t: number) => void;
}

/** Held outside React, so that play moves the drawings that follow time and nothing else. */
export function createPlaceAndTime(): PlaceAndTimeStore {
  let state: PlaceAndTime = { at: null, t: null };
  const listeners = new Set<() => void>();
  const set = (change: Partial<PlaceAndTime>) => {
    const next = { ...state, ...change };
    if (next.at === state.at && next.t === state.t) return;
    state = next;
    listeners.forEach((listener) => listener());
  };
  return {
    get: () => state,
    set,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    setAt: (at) => set({ at }),
    setT: (t) => set({ t }),
  };
}

const stores = new Map<string, PlaceAndTimeStore>();

/** One store a study, so that every screen of it stands at the same place and time. */
export function placeAndTimeOf(studyId: string): PlaceAndTimeStore {
  let store = stores.get(studyId);
  if (!store) stores.set(studyId, (store = createPlaceAndTime()));
  return store;
}

/** The address says `at` in m and `t` in s; anything else is as if it were not there. */
export function readPlaceAndTime(params: { at?: unknown; t?: unknown }): Partial<PlaceAndTime> {
  const at = readNumber(params.at);
  const t = readNumber(params.t);
  return { ...(at === null ? {} : { at }), ...(t === null ? {} : { t }) };
}

export function writePlaceAndTime({ at, t }: PlaceAndTime): { at?: string; t?: string } {
  return {
    ...(at === null ? {} : { at: String(Number(at.toFixed(2))) }),
    ...(t === null ? {} : { t: String(Number(t.toFixed(1))) }),
  };
}

function readNumber(value: unknown): number | null {
  if (typeof value !== 'string' || value.trim() === '') return null;
  const number = Number(value);
  return Number.isFinite(number) ? number : null;
}
