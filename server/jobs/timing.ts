/** How the queue is worked off; milliseconds. Tests shorten it. */
export interface QueueTiming {
  /** Renewing leases, looking for cancels and for work of other processes. */
  beat: number;
  /** How long a claim holds without being renewed. */
  lease: number;
}

export const QUEUE_TIMING: QueueTiming = { beat: 500, lease: 10_000 };

/** A run whose worker or server broke off is begun again at most twice. */
export const MAX_ATTEMPTS = 3;
