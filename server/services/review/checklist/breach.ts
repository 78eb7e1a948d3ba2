import {
  BREACH_REGRESSIONS,
  type BreachInputs,
  type BreachQuantity,
} from '../../../../shared/breach/regressions';
import type { CaseFile } from '../../../../shared/case/caseFile';
import type { BreachInput, ReservoirInput } from '../../../../shared/case/structures';
import { q, say, sayAll, type Said } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

const MINUTE = 60;
const RULE =
  'Average width and formation time lie within what published regressions on past failures give (USBR 1988; Von Thun & Gillette 1990; Froehlich 1995, 2008; MacDonald & Langridge-Monopolis 1984); they spread widely (Wahl 2001).';

/** Every dam that fails over time, against the regressions for its reservoir. */
export const breach: ChecklistRule = ({ caseFile }) => {
  const breaches = caseFile.structures.filter((structure) => structure.kind === 'breach');
  if (breaches.length === 0) return null;
  const item = { id: 'breach', title: 'Breach parameters', rule: RULE };
  const compared = breaches.map((dam) => compare(caseFile, dam));
  const finding = sayAll(compared.map(({ words }) => words));
  if (compared.some(({ within }) => within === null)) return { ...item, outcome: 'asked', finding };
  return { ...item, outcome: compared.every(({ within }) => within) ? 'good' : 'look', finding };
};

/** `within` null: there is no storage to compare with. */
function compare(
  { upstream }: CaseFile,
  dam: BreachInput,
): { within: boolean | null; words: Said } {
  const inputs = upstream.kind === 'reservoir' ? inputsOf(upstream, dam) : null;
  if (!inputs)
    return {
      within: null,
      words: say`${dam.id}: no storage above the breach is known to the model; say where width and formation time come from.`,
    };
  const width = dam.bottomWidth + dam.sideSlope * inputs.breachHeight;
  const widths = rangeOf('width', inputs);
  const times = rangeOf('formationTime', inputs);
  const within =
    width >= widths[0] &&
    width <= widths[1] &&
    dam.formationTime >= times[0] &&
    dam.formationTime <= times[1];
  const minutes = (seconds: number) => `${Math.round(seconds / MINUTE)} min`;
  return {
    within,
    words: say`${dam.id}: average width ${q(width, 'length')}, regressions ${q(widths[0], 'length')} to ${q(widths[1], 'length')}; formation in ${minutes(dam.formationTime)}, regressions ${minutes(times[0])} to ${minutes(times[1])}.`,
  };
}

/** The dam is taken as high as its breach. null where no water stands above the breach. */
function inputsOf(reservoir: ReservoirInput, dam: BreachInput): BreachInputs | null {
  const { initialStage, stages, volumes } = reservoir;
  const top = Math.min(...dam.crest.map(([, level]) => level));
  const stage = dam.trigger.kind === 'stage' ? dam.trigger.stage : initialStage;
  const waterDepth = stage - dam.bottomLevel;
  const breachHeight = top - dam.bottomLevel;
  const storage = volumeAt(stages, volumes, stage);
  const waterVolume = storage - volumeAt(stages, volumes, dam.bottomLevel);
  if (!(waterDepth > 0 && breachHeight > 0 && waterVolume > 0)) return null;
  return {
    waterDepth,
    breachHeight,
    damHeight: breachHeight,
    waterVolume,
    storage,
    failure: dam.mode,
    embankment: 'earthfill',
    erodibility: 'high',
  };
}

/** Least and largest of the regressions, over both erodibilities. */
function rangeOf(quantity: BreachQuantity, inputs: BreachInputs): [number, number] {
  const values = BREACH_REGRESSIONS.filter((regression) => regression.quantity === quantity)
    .flatMap(({ predict }) => [predict(inputs), predict({ ...inputs, erodibility: 'low' })])
    .filter(Number.isFinite);
  return [Math.min(...values), Math.max(...values)];
}

/** Linear between the stages given; held at the ends. */
function volumeAt(stages: number[], volumes: number[], stage: number): number {
  const next = stages.findIndex((value) => value >= stage);
  if (next === 0) return volumes[0];
  if (next < 0) return volumes[volumes.length - 1];
  const share = (stage - stages[next - 1]) / (stages[next] - stages[next - 1]);
  return volumes[next - 1] + share * (volumes[next] - volumes[next - 1]);
}
