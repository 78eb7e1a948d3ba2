import { asSaid, type Said } from './message';

/** An error whose words can be told in the study's units; its message is in SI. */
export class SaidError extends Error {
  readonly said: Said;

  constructor(words: string | Said) {
    super(asSaid(words).message);
    this.name = 'SaidError';
    this.said = asSaid(words);
  }
}
