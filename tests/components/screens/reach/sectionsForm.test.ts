import { ValidationError } from 'yup';
import {
  changesNothing,
  roughnessAt,
  sectionsFormSchema,
  sectionsFormStart,
  toSectionsChange,
  type SectionsFormValues,
} from '@/components/screens/reach/sectionsForm';
import { sectionsChangeSchema } from '@/shared/reaches/schemas';
import type { ReachSection } from '@/shared/reaches/types';

const section: ReachSection = {
  id: 'XS-07',
  chainage: 3360,
  points: [
    [0, 14],
    [40, 10],
    [50, 6],
    [60, 10],
    [120, 14],
  ],
  roughness: [
    [0, 0.06],
    [40, 0.034],
    [60, 0.055],
  ],
  banks: [40, 60],
  coordinates: null,
  thalweg: 6,
  leftBank: 10,
  rightBank: 10,
  bankfull: { depth: 4, topWidth: 20, area: 40, conveyance: 900 },
};

const faults = async (change: Partial<SectionsFormValues>): Promise<Record<string, string>> => {
  try {
    await sectionsFormSchema.validate(
      { ...sectionsFormStart(section), ...change },
      { abortEarly: false },
    );
    return {};
  } catch (error) {
    if (!(error instanceof ValidationError)) throw error;
    return Object.fromEntries(error.inner.map(({ path, message }) => [path, message]));
  }
};

describe('the form for bank marks and roughness', () => {
  it('starts from the section as it stands, and changes nothing', () => {
    const start = sectionsFormStart(section);
    expect(start).toMatchObject({ leftBank: 40, rightBank: 60 });
    expect(start).toMatchObject({ left: 0.06, channel: 0.034, right: 0.055 });
    expect(start.zones).toHaveLength(3);
    expect(changesNothing(start)).toBe(true);
  });

  it('reads the roughness that holds at an offset', () => {
    expect(roughnessAt(section, 39.9)).toBe(0.06);
    expect(roughnessAt(section, 40)).toBe(0.034);
    expect(roughnessAt(section, 500)).toBe(0.055);
    expect(roughnessAt({ roughness: [] }, 5)).toBeNull();
  });

  it('asks only for what is to change', async () => {
    expect(await faults({ leftBank: null, left: null })).toEqual({});
    expect(await faults({ banks: 'set', leftBank: null })).toEqual({
      leftBank: 'Give the offset of the left bank.',
    });
    expect(await faults({ roughness: 'byBank', channel: null, right: 1.2 })).toEqual({
      channel: "Give Manning's n.",
      right: "Manning's n is below 1.",
    });
  });

  it('keeps banks and zones in their order across the river', async () => {
    expect(Object.keys(await faults({ banks: 'set', leftBank: 60, rightBank: 60 }))).toEqual([
      'rightBank',
    ]);
    const zones = [
      { from: 0, n: 0.05 },
      { from: 60, n: 0.03 },
      { from: 40, n: 0.05 },
    ];
    expect(Object.keys(await faults({ roughness: 'byOffset', zones }))).toEqual(['zones[2].from']);
    expect(Object.keys(await faults({ roughness: 'byOffset', zones: [] }))).toEqual(['zones']);
  });

  it('sends what the server takes, and leaves out what is kept', async () => {
    const start = sectionsFormStart(section);
    const ids = ['XS-07', 'XS-08'];
    const bodies = [
      toSectionsChange({ ...start, banks: 'set' }, ids, 3),
      toSectionsChange({ ...start, banks: 'clear' }, ids, 3),
      toSectionsChange({ ...start, roughness: 'byBank' }, ids, 3),
      toSectionsChange({ ...start, roughness: 'byOffset' }, ids, 3),
    ];
    const same = { version: 3, sectionIds: ids };
    expect(bodies).toEqual([
      { ...same, banks: [40, 60] },
      { ...same, banks: null },
      { ...same, roughnessByBank: { left: 0.06, channel: 0.034, right: 0.055 } },
      { ...same, roughness: section.roughness },
    ]);
    for (const body of bodies)
      await expect(sectionsChangeSchema.validate(body, { strict: true })).resolves.toBeTruthy();
  });
});
