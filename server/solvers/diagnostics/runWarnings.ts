import type { CaseFile } from '../../../shared/case/caseFile';
import type { RunWarning, SectionResult } from '../../../shared/case/resultFile';
import { q, say } from '../../../shared/units/message';
import { LEAST_SPREAD } from '../geometry/parts';
import type { Grid } from '../geometry/grid';
import type { Workspace } from '../workspace';

/** Watches for what the reader of the results has to know. */
export interface RunWarnings {
  add(warning: RunWarning): void;
  /** Looks at the state at an output time. */
  watch(time: number): void;
  /** All warnings, with those that only the whole run can tell. */
  conclude(sections: SectionResult[], missingLateral: number): RunWarning[];
}

const hours = (seconds: number): string => `${(seconds / 3600).toFixed(2)} h`;

export function createRunWarnings(
  caseFile: CaseFile,
  workspace: Workspace,
  grid: Grid,
): RunWarnings {
  const { n, dx, area, flow, stage, celerity, faceFlow, parts } = workspace;
  const { sections, downstream } = caseFile;
  const warnings: RunWarning[] = [];
  const fast = { length: 0, time: 0, chainage: 0 };
  const outlet = { supercriticalFrom: NaN, highest: -Infinity, highestTime: 0 };
  const outletSection = n + 1;
  const isControlled = !['open', 'criticalDepth', 'wall'].includes(downstream.kind);
  adviseOnSurvey();

  function adviseOnSurvey(): void {
    const smooth = sections.filter((section) => section.roughness.some(([, value]) => value === 0));
    if (smooth.length > 0) {
      warnings.push({
        code: 'frictionless',
        message:
          `Manning's n is 0 in ${named(smooth)}: water runs there without friction. ` +
          'That is for tests; give a roughness for a real river.',
        chainage: smooth[0].chainage,
        time: null,
      });
    }
    const unpaired = sections.filter(
      (section, k) =>
        k > 0 && (section.banks === undefined) !== (sections[k - 1].banks === undefined),
    );
    if (unpaired.length > 0) {
      warnings.push({
        code: 'banksUnpaired',
        message:
          `Bank marks stand on one side only of ${unpaired.length} of the gaps between sections, ` +
          `first above ${unpaired[0].id}. There the sections are interpolated over their whole width. ` +
          'Mark the banks on both neighbours.',
        chainage: unpaired[0].chainage,
        time: null,
      });
    }
  }

  /** Flow (m³/s) at which a wave against flow `q` would stand in cell i. */
  function criticalFlow(i: number, q: number): number {
    if (!parts) return area[i] * celerity[i];
    const { flowArea, beta, spread } = parts;
    const c2 = celerity[i] ** 2;
    const v = q / flowArea[i];
    const wave = Math.sqrt(Math.max(LEAST_SPREAD * c2, c2 + spread[i] * v * v));
    return (flowArea[i] * wave) / beta[i];
  }

  function watchSpeed(time: number): void {
    let count = 0;
    let first = 0;
    for (let i = 1; i <= n; i++) {
      const q = 0.5 * Math.abs(faceFlow[i - 1] + faceFlow[i]);
      if (area[i] > 0 && flow[i] !== 0 && q > 1.001 * criticalFlow(i, q)) {
        if (count === 0) first = i;
        count++;
      }
    }
    if (count * dx > fast.length) {
      fast.length = count * dx;
      fast.time = time;
      fast.chainage = grid.chainage[first - 1];
    }
  }

  function watchOutlet(time: number): void {
    if (stage[outletSection] > outlet.highest && area[outletSection] > 0) {
      outlet.highest = stage[outletSection];
      outlet.highestTime = time;
    }
    if (!isControlled || !(area[outletSection] > 0) || Number.isFinite(outlet.supercriticalFrom)) {
      return;
    }
    const most = Math.sqrt(1.01) * criticalFlow(n, flow[n]);
    if (flow[n] > most && faceFlow[n] > 0) outlet.supercriticalFrom = time;
  }

  return {
    add: (warning) => warnings.push(warning),
    watch(time) {
      watchSpeed(time);
      watchOutlet(time);
    },
    conclude(results, missingLateral) {
      warnAboveSurvey(results);
      if (fast.length > 0) {
        warnings.push({
          code: 'supercritical',
          ...say`Flow is supercritical over up to ${q(fast.length, 'length', { decimals: 0 })} of the reach (at ${hours(fast.time)}, first at chainage ${q(fast.chainage, 'chainage')}). Long supercritical flow is rare in natural rivers: check slope and roughness there.`,
          chainage: fast.chainage,
          time: fast.time,
        });
      }
      if (Number.isFinite(outlet.supercriticalFrom)) {
        warnings.push({
          code: 'outletSupercritical',
          message:
            `Water reached the outlet supercritical from ${hours(outlet.supercriticalFrom)} on: ` +
            'the outlet condition has no influence while it does.',
          chainage: sections[sections.length - 1].chainage,
          time: outlet.supercriticalFrom,
        });
      }
      if (downstream.kind === 'rating') {
        const top = downstream.stages[downstream.stages.length - 1];
        if (outlet.highest > top + 1e-6) {
          warnings.push({
            code: 'ratingExceeded',
            ...say`The outlet rating ends at ${q(top, 'elevation')}; the water there rose to ${q(outlet.highest, 'elevation')} (${hours(outlet.highestTime)}). Beyond its end the rating was continued along its last line: extend it.`,
            chainage: sections[sections.length - 1].chainage,
            time: outlet.highestTime,
          });
        }
      }
      if (missingLateral > 1e-6) {
        warnings.push({
          code: 'lateralLimited',
          ...say`Lateral withdrawals asked for ${q(missingLateral, 'volume', { figures: 3 })} more than there was; only the water that was there was taken.`,
          chainage: null,
          time: null,
        });
      }
      return warnings;
    },
  };

  function warnAboveSurvey(results: SectionResult[]): void {
    let count = 0;
    let worst = 0;
    let excess = 0;
    results.forEach(({ peak }, k) => {
      const { points } = sections[k];
      const over = peak.stage - Math.min(points[0][1], points[points.length - 1][1]);
      if (!(over > 1e-6) || !(peak.depth > 0)) return;
      count++;
      if (over > excess) {
        excess = over;
        worst = k;
      }
    });
    if (count === 0) return;
    warnings.push({
      code: 'aboveSurvey',
      ...say`Water rose above the surveyed ends of ${count} of ${results.length} sections, most at ${results[worst].id}: by ${q(excess, 'depth')} at ${hours(results[worst].peak.stageTime)}. Beyond its ends a section is continued by vertical walls without friction, so real water would spread wider and stand lower: extend the survey.`,
      chainage: results[worst].chainage,
      time: results[worst].peak.stageTime,
    });
  }
}

function named(sections: readonly { id: string }[]): string {
  const shown = sections
    .slice(0, 5)
    .map(({ id }) => id)
    .join(', ');
  return sections.length > 5 ? `${shown} and ${sections.length - 5} more sections` : shown;
}
