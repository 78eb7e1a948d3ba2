import { createFaceFlow } from '../../../server/solvers/diagnostics/faceFlow';
import { at, kernelParts } from './kernelParts';
import { rectangle } from './sections';

const parts = () => kernelParts(at(rectangle(1), 0), at(rectangle(1), 20), 2).workspace;

describe('the reported flow', () => {
  it('is the mean of the fluxes that stand at a moment: of the step that ends and of the one that begins', () => {
    const workspace = parts();
    const flow = createFaceFlow(workspace, 2);
    workspace.fluxArea.set([1, 2, 3]);
    flow.follow();
    // At the first moment there is one only.
    expect([...workspace.faceFlow.slice(0, 3)]).toEqual([1, 2, 3]);
    workspace.fluxArea.set([2, 4, 6]);
    flow.keep();
    workspace.fluxArea.set([4, 4, 4]);
    flow.follow();
    expect([...workspace.faceFlow.slice(0, 3)]).toEqual([3, 4, 5]);
  });

  it('of an Euler step is the flux of its start', () => {
    const workspace = parts();
    const flow = createFaceFlow(workspace, 1);
    workspace.fluxArea.set([2, 4, 6]);
    flow.keep();
    workspace.fluxArea.set([4, 4, 4]);
    flow.follow();
    expect([...workspace.faceFlow.slice(0, 3)]).toEqual([4, 4, 4]);
  });
});
