import { editDrawingModel, pointNear } from '@/components/screens/reach/edit/editDrawingModel';
import { keyStep } from '@/components/screens/reach/edit/keyStep';
import {
  channelWindow,
  scaledWindow,
  wholeWindow,
  windowShowing,
} from '@/components/screens/reach/edit/sectionWindow';
import { plainSections } from '@/tests/helpers/plainSections';

const [section] = plainSections();
const size = { width: 400, height: 280 };

describe('the drawing that is drawn upon', () => {
  it('goes from metres to pixels and back', () => {
    for (const system of ['metric', 'usCustomary'] as const) {
      const model = editDrawingModel(size, section.points, [0, 58], [], system);
      const [y, z] = model.at(model.px(26), model.py(10));
      expect([y, z]).toEqual([expect.closeTo(26, 9), expect.closeTo(10, 9)]);
    }
  });

  it('finds the point under the hand, and none where there is none', () => {
    const model = editDrawingModel(size, section.points, [0, 58], [], 'metric');
    const at = (y: number, z: number) => [model.px(y), model.py(z)] as const;
    expect(pointNear(section.points, model, at(26.3, 10.1), 14)).toBe(3);
    expect(pointNear(section.points, model, at(29, 14), 14)).toBeNull();
  });

  it('shows the whole section, its channel, or as much as is asked for', () => {
    expect(wholeWindow(section)).toEqual([0, 58]);
    // Banks at 20 and 38 with a fifth of 18 m beside.
    expect(channelWindow(section)).toEqual([16.4, 41.6]);
    expect(channelWindow({ ...section, banks: null })).toBeNull();
    expect(scaledWindow(section, [0, 58], 29, 0.5)).toEqual([14.5, 43.5]);
    expect(scaledWindow(section, [0, 58], 2, 0.5)).toEqual([0, 29]);
    expect(scaledWindow(section, [14.5, 43.5], 29, 4)).toEqual([0, 58]);
    expect(windowShowing(section, [10, 20], 48)).toEqual([43, 53]);
    expect(windowShowing(section, [10, 20], 15)).toEqual([10, 20]);
  });

  it('takes arrows to move and pages to choose', () => {
    const press = (key: string, change = {}) =>
      keyStep(
        { key, shiftKey: false, altKey: false, ctrlKey: false, metaKey: false, ...change },
        3,
        8,
      );
    expect(press('ArrowUp')).toEqual({ kind: 'move', across: 0, up: 0.01 });
    expect(press('ArrowLeft', { shiftKey: true })).toEqual({ kind: 'move', across: -1, up: 0 });
    expect(press('PageDown')).toEqual({ kind: 'choose', index: 4 });
    expect(press('End')).toEqual({ kind: 'choose', index: 7 });
    expect(press('ArrowUp', { ctrlKey: true })).toBeNull();
    expect(press('a')).toBeNull();
  });
});
