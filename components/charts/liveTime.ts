/** The time of the store for drawings that follow it by themselves, frame by frame, while React draws a few times a second. */
export interface LiveTime {
  /** s from start. */
  time: () => number;
  /** Told of every change. */
  subscribe: (listener: () => void) => () => void;
}
