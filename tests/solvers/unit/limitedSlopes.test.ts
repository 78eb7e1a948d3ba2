import { createLimitedSlopes, vanLeer } from '../../../server/solvers/reconstruction/limitedSlopes';
import { at, kernelParts } from './kernelParts';
import { rectangle } from './sections';

function slopesOf(stages: number[], flows: number[] = stages.map(() => 0)) {
  const n = stages.length;
  const { workspace, state } = kernelParts(at(rectangle(2), 0), at(rectangle(2), 10 * n), n);
  stages.forEach((stage, k) => {
    state.placeAtStage(k + 1, stage);
    workspace.flow[k + 1] = flows[k];
  });
  createLimitedSlopes(workspace)();
  return {
    stage: [...workspace.slopeStage.slice(1, n + 1)],
    flow: [...workspace.slopeFlow.slice(1, n + 1)],
  };
}

describe('limited slopes', () => {
  it('take the harmonic mean of both sides, and none at an extremum', () => {
    expect(vanLeer(2, 2)).toBe(2);
    expect(vanLeer(1, 3)).toBe(1.5);
    expect(vanLeer(-1, 3)).toBe(0);
    expect(vanLeer(0, 3)).toBe(0);
    expect(vanLeer(-1, -3)).toBe(-1.5);
  });

  it('are exact on a straight surface, ends included', () => {
    const { stage, flow } = slopesOf([5, 5.1, 5.2, 5.3, 5.4], [1, 2, 3, 4, 5]);
    for (const s of stage) expect(s).toBeCloseTo(0.1, 12);
    for (const s of flow) expect(s).toBeCloseTo(1, 12);
  });

  it('make no new extremum', () => {
    const { stage } = slopesOf([5, 5.4, 5.3, 5.9, 6]);
    expect(stage[1]).toBe(0);
    expect(stage[2]).toBe(0);
    expect(stage[3]).toBeCloseTo(vanLeer(0.6, 0.1), 12);
  });

  it('leave a cell beside dry ground flat', () => {
    const { stage } = slopesOf([2, 1.5, 1, 0.5, 0]);
    expect(stage[3]).toBe(0);
    expect(stage[4]).toBe(0);
    expect(stage[1]).toBeCloseTo(-0.5, 12);
  });

  it('empty no cell: at most A/B over a cell', () => {
    const { stage } = slopesOf([9, 5, 1, 0.1, 0.09]);
    expect(stage[2]).toBe(-1);
  });

  it('do without neighbours in a reach of one cell', () => {
    expect(slopesOf([3]).stage).toEqual([0]);
    expect(slopesOf([3, 3.5]).stage).toEqual([0.5, 0.5]);
  });
});
