import { say, typed } from '../../units/message';
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
    faults.number('initial.stage', value.stage, 'a stage', 'elevation');
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
      faults.number('initial.chainage', value.chainage, 'a chainage', 'chainage')
    ) {
      if (ends && (value.chainage < ends[0] || value.chainage > ends[1])) {
        faults.add(
          'initial.chainage',
          say`the dam at ${typed(value.chainage, 'chainage')} lies outside the reach, ${typed(ends[0], 'chainage')} to ${typed(ends[1], 'chainage')}`,
        );
      }
    }
    for (const key of ['stageAbove', 'stageBelow']) {
      if (key in value && value[key] !== null) {
        faults.number(`initial.${key}`, value[key], 'a stage or null for dry,', 'elevation');
      }
    }
  }
}

function kindOfPart(value: unknown): unknown {
  return typeof value === 'object' && value !== null && 'kind' in value ? value.kind : undefined;
}
