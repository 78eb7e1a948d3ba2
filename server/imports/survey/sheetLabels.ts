import type { LengthUnit } from '../../../shared/surveys/types';
import { HEADING_WORDS } from '../headings/headingWords';
import { METRES_PER } from '../headings/lengthUnits';
import { readHeading } from '../headings/readHeading';
import type { DecimalMark } from '../../../shared/numbers/decimalMark';
import { parseLength } from '../numbers/parseLength';
import { cellText } from '../workbook/cellText';
import type { Grid } from '../workbook/types';

export interface SheetLabels {
  /** From a cell labelled as the section, else the sheet's name. */
  id: string;
  /** m; null where neither a labelled cell nor the sheet's name tells. */
  chainage: number | null;
  /** 0-based place of the chainage's cell; null where the sheet's name tells it. */
  chainageAt: { row: number; column: number } | null;
}

/** Of a sheet that holds one section: what the cells above its table, or its name, say of it. */
export function sheetLabels(
  grid: Grid,
  above: number,
  decimal: DecimalMark,
  defaultUnit: LengthUnit,
): SheetLabels {
  const labels: SheetLabels = { id: grid.name.trim(), chainage: null, chainageAt: null };
  for (let row = 0; row < above; row++) {
    (grid.rows[row] ?? []).forEach((cell, column) => {
      if (cell?.kind !== 'text') return;
      const [label, own] = cell.text.split(/[:=]/, 2);
      const heading = readHeading(label);
      const field = HEADING_WORDS.get(heading.words);
      const value = own?.trim() || nextText(grid, row, column);
      if (!value) return;
      if (field === 'section') labels.id = value;
      if (field !== 'chainage' || labels.chainage !== null) return;
      const unit = heading.unit ?? (/\bkm\b/.test(heading.words) ? 'km' : defaultUnit);
      const length = parseLength(value, decimal, unit);
      if (length === null) return;
      labels.chainage = length * METRES_PER[unit];
      labels.chainageAt = { row, column };
    });
  }
  labels.chainage ??= chainageOfName(grid.name, decimal, defaultUnit);
  return labels;
}

function nextText(grid: Grid, row: number, column: number): string {
  const right = (grid.rows[row] ?? []).slice(column + 1).find((cell) => cell);
  return cellText(right);
}

/** `XS-07 ch 3,250`, `km 1.2`, `Section 4 (1200 m)`, `PK 1+250`. A bare number after a name is its number, no chainage. */
function chainageOfName(name: string, decimal: DecimalMark, defaultUnit: LengthUnit) {
  const number = String.raw`(\d[\d.,+]*)`;
  const labelled = new RegExp(
    String.raw`\b(ch|chainage|km|pk|sta|station)\.?\s*${number}\s*(km|m|ft)?\b`,
    'i',
  ).exec(name);
  const measured = new RegExp(String.raw`(?:^|[\s(_@-])${number}\s*(km|m|ft)\b`, 'i').exec(name);
  const text = labelled?.[2] ?? measured?.[1];
  if (!text) return null;
  const named = (labelled?.[3] ?? measured?.[2] ?? '').toLowerCase();
  const isKm = named === 'km' || (!named && labelled?.[1].toLowerCase() === 'km');
  const unit: LengthUnit = isKm ? 'km' : named === 'm' || named === 'ft' ? named : defaultUnit;
  const value = parseLength(text.replace(/[.,]$/, ''), decimal, unit);
  return value === null ? null : value * METRES_PER[unit];
}
