import type { ReachEnds } from './boundaryFaults';
import type { Faults } from './faults';
import { checkSeries } from './seriesFaults';

export function checkInitial(
  faults: Faults,
  value: unknown,
  ends: ReachEnds,
  upstream: unknown,
  downstream: unknown,
): void {
  const path = 'initial';
  const kind = faults.kind(path, value, ['steady', 'still', 'profile', 'dam']);
  if (kind === 'steady') {
    faults.record(path, value, ['kind']);
    if (kindOfPart(downstream) === 'wall' && kindOfPart(upstream) !== 'wall') {
      faults.add(
        'initial.kind',
        'there is no steady flow in front of a wall downstream; give still, profile or dam',
      );
    }
  }
  if (kind === 'still' && faults.record(path, value, ['kind', 'stage']) && 'stage' in value) {
    faults.number('initial.stage', value.stage, 'a stage in m');
  }
  if (kind === 'profile') {
    if (!faults.record(path, value, ['kind', 'chainages', 'stages', 'flows'])) return;
    checkSeries(faults, path, value, { at: 'chainages', values: ['stages', 'flows'] });
  }
  if (kind === 'dam') {
    const required = ['kind', 'chainage', 'stageAbove', 'stageBelow'];
    if (!faults.record(path, value, required)) return;
    if (
      'chainage' in value &&
      faults.number('initial.chainage', value.chainage, 'a chainage in m')
    ) {
      if (ends && (value.chainage < ends[0] || value.chainage > ends[1])) {
        faults.add(
          'initial.chainage',
          `the dam at ${value.chainage} m lies outside the reach, ${ends[0]} m to ${ends[1]} m`,
        );
      }
    }
    for (const key of ['stageAbove', 'stageBelow']) {
      if (key in value && value[key] !== null) {
        faults.number(`initial.${key}`, value[key], 'a stage in m, or null for dry');
      }
    }
  }
}

function kindOfPart(value: unknown): unknown {
  return typeof value === 'object' && value !== null && 'kind' in value ? value.kind : undefined;
}
