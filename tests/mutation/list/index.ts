import type { Mutation } from '../mutation';
import { CELLS } from './cells';
import { ENDS } from './ends';
import { FLUXES } from './fluxes';
import { INITIAL } from './initial';
import { STRUCTURES } from './structures';

export const MUTATIONS: readonly Mutation[] = [
  ...FLUXES,
  ...CELLS,
  ...ENDS,
  ...INITIAL,
  ...STRUCTURES,
];
