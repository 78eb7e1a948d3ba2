/** The chosen place (chainage, m) and time (s from start) of a study; null before one is chosen. */
export interface PlaceAndTime {
  at: number | null;
  t: number | null;
}

export interface PlaceAndTimeStore {
  get: () => PlaceAndTime;
  set: (change: Partial<PlaceAndTime>) => void;
  /** Told of every change, each frame while the flood plays: for what moves itself, without React. */
  subscribe: (listener: () => void) => () => void;
  /** As `get`, but while the flood plays only a few times a second: what React draws. */
  shown: () => PlaceAndTime;
  subscribeShown: (listener: () => void) => () => void;
  setAt: (at: number) => void;
  setT: (t: number) => void;
  /** Moves the time while the flood plays; `now` is the clock of the frame, ms. */
  playT: (t: number, now: number) => void;
  /** What is shown catches up, once the flood stands. */
  settle: () => void;
}

/** Between two drawings by React while the flood plays, ms: as fast as figures can be read. */
const SHOWN_MS = 250;

/** Held outside React, so that play moves the drawings that follow time and nothing else. */
export function createPlaceAndTime(): PlaceAndTimeStore {
  let state: PlaceAndTime = { at: null, t: null };
  let shown = state;
  let shownAt = -Infinity;
  const listeners = new Set<() => void>();
  const shownListeners = new Set<() => void>();
  const move = (change: Partial<PlaceAndTime>) => {
    const next = { ...state, ...change };
    if (next.at === state.at && next.t === state.t) return;
    state = next;
    listeners.forEach((listener) => listener());
  };
  const settle = () => {
    if (shown === state) return;
    shown = state;
    shownListeners.forEach((listener) => listener());
  };
  const set = (change: Partial<PlaceAndTime>) => {
    move(change);
    settle();
  };
  return {
    get: () => state,
    set,
    subscribe: subscribeTo(listeners),
    shown: () => shown,
    subscribeShown: subscribeTo(shownListeners),
    setAt: (at) => set({ at }),
    setT: (t) => set({ t }),
    playT: (t, now) => {
      move({ t });
      if (now - shownAt < SHOWN_MS) return;
      shownAt = now;
      settle();
    },
    settle,
  };
}

const subscribeTo = (listeners: Set<() => void>) => (listener: () => void) => {
  listeners.add(listener);
  return () => void listeners.delete(listener);
};

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
