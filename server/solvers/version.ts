/** Changes with every change that can alter a result by a bit. */
export const SOLVER_VERSION = '1.2.0';
