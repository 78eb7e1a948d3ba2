import type { ReachRow } from '@/shared/reaches/types';
import type { Run } from '@/shared/runs/types';
import type { Study } from '@/shared/studies/types';
import type { TaskSet } from '@/shared/tasks/types';
import type { VerificationCaseRow } from '@/shared/verificationCases/types';
import type { PictureSource } from './pictureContext';

type Titled = Pick<Study, 'title'>;

/** Where a picture of a run comes from: nothing unsigned leaves the page without saying so. */
export function pictureOfRun(
  run: Pick<Run, 'studyTitle' | 'number' | 'scenarioName' | 'review'>,
): PictureSource {
  const [words, ending] = standing(run.review);
  return {
    stem: `Run ${run.number}`,
    foot: [run.studyTitle, `Run ${run.number}, ${run.scenarioName}. ${words}.`],
    ending,
  };
}

function standing(review: Run['review']): [words: string, ending: string] {
  if (review === 'withdrawn') return ['Withdrawn, not to be relied on', 'withdrawn'];
  const signed = review === 'signed' || review === 'issued';
  return signed ? ['Signed', 'signed'] : ['Preliminary, not signed', 'preliminary'];
}

const BESIDE = 'Beside the signed report, not part of it';

/** Runs side by side: nobody signs that. */
export function pictureOfRuns(
  study: Titled,
  runs: readonly Pick<Run, 'number' | 'scenarioName'>[],
): PictureSource {
  const named = runs.map(({ number, scenarioName }) => `run ${number}, ${scenarioName}`);
  return {
    stem: `Runs ${runs.map(({ number }) => number).join(' and ')}`,
    foot: [study.title, `Compared: ${named.join('; ')}. ${BESIDE}.`],
    ending: 'unsigned',
  };
}

/** A set of runs about a run, or a search. */
export const pictureOfSet = (
  study: Titled,
  { name, id }: Pick<TaskSet, 'name' | 'id'>,
): PictureSource => ({
  stem: `Set ${id}`,
  foot: [study.title, `${name}. ${BESIDE}.`],
  ending: 'unsigned',
});

export const pictureOfReach = (study: Titled, { name }: Pick<ReachRow, 'name'>): PictureSource => ({
  stem: name,
  foot: [study.title, `Reach: ${name}.`],
  ending: '',
});

/** Two geometries of a reach, the older one first. */
export const pictureOfGeometries = (
  study: Titled,
  [before, after]: readonly [string, string],
): PictureSource => ({
  stem: `${before} and ${after}`,
  foot: [study.title, `Reach: ${before} against ${after}.`],
  ending: '',
});

/** What is typed, which the run that is signed may not hold. */
export const pictureOfScenario = (study: Titled, name: string): PictureSource => ({
  stem: name,
  foot: [study.title, `Scenario: ${name}. As typed, not a result.`],
  ending: 'draft',
});

export const pictureOfCase = (
  { id, title, source }: Pick<VerificationCaseRow, 'id' | 'title' | 'source'>,
  solver: string,
): PictureSource => ({
  stem: `Proof ${id}`,
  foot: [`${title}. Solver ${solver}.`, source],
  ending: '',
});
