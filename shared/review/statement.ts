/** What a senior engineer confirms by signing; shown in full before the password is asked for. */
export const signStatement = (run: {
  studyTitle: string;
  scenarioName: string;
  number: number;
}): string =>
  `I have checked run ${run.number} of "${run.studyTitle}", scenario "${run.scenarioName}": its survey, inputs, method, ` +
  'checklist and points. In my professional judgement the result is fit for the purpose that the study states, within ' +
  'the limits that the report names. I did not run it myself.';
