import type { ConvergenceResult, GridRow } from '../../../../shared/confidence/types';
import { formatNumber } from '../../../../shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '../../../../shared/units/units';
import type { Sheet } from '../../pdf/sheet';
import { table } from '../../pdf/table';
import { note, paragraph } from '../../pdf/writing';
import { unitsOf } from '../../words';

/** Three grids: differences, observed order and index. */
export function convergencePart(sheet: Sheet, result: ConvergenceResult, system: UnitSystem): void {
  const unit = unitsOf(system);
  const { along, grids, stations, widest } = result;
  const difference = Math.abs(widest.difference);
  const order =
    along.order === null
      ? 'No order can be told.'
      : `Observed order of the peak stage ${formatNumber(along.order, 1)} (middle of the places).`;
  paragraph(
    sheet,
    `The finest two grids differ in peak stage by at most ${formatNumber(fromSi(difference, 'depth', system), 3)} ${UNITS[system].depth.symbol}, at chainage ${unit(widest.chainage, 'chainage')}; ${unit(0.05, 'depth')} is good (common practice). ${order}`,
  );
  const size = (cellSize: number | null) =>
    cellSize === null ? 'failed' : unit(cellSize, 'length');
  table(
    sheet,
    [
      { heading: 'Place', share: 3 },
      { heading: 'Value', share: 2.4 },
      ...grids.map(({ cellSize }) => ({
        heading: size(cellSize),
        share: 1.7,
        align: 'right' as const,
      })),
      { heading: 'Order', share: 1.1, align: 'right' },
      { heading: 'Band', share: 1.8, align: 'right' },
    ],
    stations.flatMap(({ name, peakStage, peakFlow, arrival }) => [
      row(name, `peak stage, ${UNITS[system].elevation.symbol}`, peakStage, (si, more) =>
        formatNumber(fromSi(si, 'elevation', system), 2 + more),
      ),
      row(name, `peak flow, ${UNITS[system].flow.symbol}`, peakFlow, (si, more) =>
        formatNumber(fromSi(si, 'flow', system), more),
      ),
      row(name, 'arrival, min', arrival, (si, more) => formatNumber(si / 60, more)),
    ]),
  );
  note(
    sheet,
    'Band: grid convergence index of the finest grid, factor of safety 1.25, in the unit of the value (Roache 1994, J. Fluids Eng. 116, 405-413; Celik and others 2008, J. Fluids Eng. 130, 078001). A dash: the three values tell no order.',
  );
}

function row(
  name: string,
  quantity: string,
  { values, convergence, band }: GridRow,
  show: (si: number, more: number) => string,
): string[] {
  return [
    name,
    quantity,
    ...values.map((si) => (si === null ? '–' : show(si, 1))),
    convergence?.order == null ? '–' : formatNumber(convergence.order, 1),
    band === null ? '–' : `± ${show(band, 2)}`,
  ];
}
