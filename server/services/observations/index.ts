import type { Platform } from '../../platform';
import { readFile, type SentFile } from '../files/readFile';
import { reachSpan } from './reachSpan';
import type { StudyModel } from '../../models/Study';
import { buildGauges } from './gauges';
import { buildMarks } from './marks';

/** What was observed of real floods: it belongs to the study and stands beside every run. */
export function buildObservations(platform: Platform) {
  return {
    marks: buildMarks(platform),
    gauges: buildGauges(platform),

    /** Marks of a file, or its faults; nothing is stored. */
    async readMarks({ id, unitSystem }: StudyModel, file: SentFile, flood: string) {
      const reach = await reachSpan(platform.models, id);
      const options = { unitSystem, flood, reach, fileName: file.name };
      return readFile(file, { kind: 'marks', options });
    },
  };
}

export type ObservationsService = ReturnType<typeof buildObservations>;
