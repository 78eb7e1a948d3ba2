export { seededRandom } from '../../shared/numbers/seededRandom';

export const round = (value: number, decimals: number): number => {
  const steps = 10 ** decimals;
  return Math.round(value * steps) / steps;
};
