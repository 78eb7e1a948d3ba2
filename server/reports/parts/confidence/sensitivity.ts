import { PARAMETERS } from '../../../../shared/confidence/parameters';
import { changeWords, VALUE_NAMES, valueText } from '../../../../shared/confidence/placeValueWords';
import { sideLabel, valueWords } from '../../../../shared/confidence/planMembers';
import type { PlaceValues, SensitivityResult } from '../../../../shared/confidence/types';
import type { UnitSystem } from '../../../../shared/units/units';
import { tornado, tornadoHeight } from '../../charts/tornado';
import { figure } from '../../pdf/figure';
import type { Sheet } from '../../pdf/sheet';
import { table } from '../../pdf/table';
import { DRAWN_STATIONS } from './drawnStations';

const QUANTITIES = Object.keys(VALUE_NAMES) as (keyof PlaceValues)[];

/** What each input changes by itself at the stations. */
export function sensitivityPart(sheet: Sheet, result: SensitivityResult, system: UnitSystem): void {
  const { base, rows, stations } = result;
  stations.slice(0, DRAWN_STATIONS).forEach(({ name }, k) => {
    const bars = rows.map(({ parameter, low, high }) => ({
      label: PARAMETERS[parameter].label,
      low: sideOf(low, parameter, k, base[k], system),
      high: sideOf(high, parameter, k, base[k], system),
    }));
    const drawing = tornado(`Change of peak stage at ${name}`, bars, (change) =>
      changeWords('peakStage', change, system),
    );
    figure(sheet, [drawing], tornadoHeight(bars), '');
  });
  table(
    sheet,
    [
      { heading: 'Station', share: 2.6 },
      { heading: 'Input', share: 3.6 },
      ...QUANTITIES.map((quantity) => ({
        heading: VALUE_NAMES[quantity],
        share: 2,
        align: 'right' as const,
      })),
    ],
    stations.flatMap(({ name }, k) => [
      [name, 'Base case', ...QUANTITIES.map((one) => valueText(one, base[k][one], system))],
      ...rows.flatMap(({ parameter, low, high }) =>
        [low, high].map((side) => [
          name,
          sideLabel(parameter, side.value, system),
          ...QUANTITIES.map((one) => {
            const [here, there] = [side.stations?.[k][one] ?? null, base[k][one]];
            return here === null || there === null
              ? 'no result'
              : changeWords(one, here - there, system);
          }),
        ]),
      ),
    ]),
  );
}

function sideOf(
  side: SensitivityResult['rows'][number]['low'],
  parameter: SensitivityResult['rows'][number]['parameter'],
  k: number,
  base: PlaceValues,
  system: UnitSystem,
) {
  const there = side.stations?.[k].peakStage;
  return {
    words: valueWords(parameter, side.value, system),
    change: there === undefined ? null : there - base.peakStage,
  };
}
