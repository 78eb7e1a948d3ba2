/** Sets the state and the fluxes at one end for a time (s); returns its fastest wave |u| + c (m/s). */
export type Boundary = (time: number) => number;
