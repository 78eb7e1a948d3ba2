import { clockFromText, clockToText } from '@/components/screens/scenarios/startClock';

describe('the clock time of the start', () => {
  it.each([
    ['2026-11-14 06:00', '2026-11-14T06:00:00.000Z'],
    ['2026-11-14T06:00', '2026-11-14T06:00:00.000Z'],
    [' 2026-1-4 6:05 ', '2026-01-04T06:05:00.000Z'],
    ['2026-11-14', '2026-11-14T00:00:00.000Z'],
    ['', null],
  ])('%j is %j', (text, iso) => {
    expect(clockFromText(text)).toEqual({ iso, fault: null });
  });

  it.each(['14 Nov', '2026-06-31 10:00', '2026-13-01', '2026-11-14 24:10', '2026-11-14 10:61'])(
    '%j is refused with what would be right',
    (text) => {
      expect(clockFromText(text)).toMatchObject({
        iso: null,
        fault: expect.stringContaining('2026-11-14 06:00'),
      });
    },
  );

  it('reads back as it was typed', () => {
    expect(clockToText('2026-11-14T06:00:00.000Z')).toBe('2026-11-14 06:00');
    expect(clockToText(null)).toBe('');
  });
});
