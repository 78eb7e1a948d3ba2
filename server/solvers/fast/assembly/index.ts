/** The fast kernel: what it lets out. The arrays that it works on stand in the memory that it is given. */
export * from './arrays';
export { slopes } from './slopes';
export { fluxes } from './fluxes';
export { correct, limitOutflow, predict } from './steps';
export { fastestWave } from './fastestWave';
