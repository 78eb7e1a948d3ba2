export interface RunProgress {
  /** 0..1 of the duration */
  fraction: number;
  /** s of model time */
  time: number;
  steps: number;
}

/** One entry a cell at an output time. The arrays are views that hold only during the call. */
export interface RunOutput {
  index: number;
  time: number;
  stage: Float64Array;
  flow: Float64Array;
  velocity: Float64Array;
}

/** What a caller may watch, and with which loops. Nothing here influences the result. */
export interface RouteOptions {
  /**
   * Which of two sets of loops runs, of the same bits: `fast` (the default) where the machine and the case allow it, or the
   * readable `reference`. See kernel.ts.
   */
  kernel?: 'fast' | 'reference';
  /** At most about ten times a second of wall time, and once at the end. */
  onProgress?: (progress: RunProgress) => void;
  onOutput?: (output: RunOutput) => void;
  /** Polled often; true makes the run throw RunCancelled. */
  shouldStop?: () => boolean;
}
