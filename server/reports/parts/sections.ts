import { crossSection } from '../charts/crossSection';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';

const ACROSS = 2;

/** Every surveyed section with the highest water in it. */
export function sections(sheet: Sheet, { facts, caseFile, sections: results }: RunReport): void {
  partHeading(sheet, 'Cross-sections', 'newPage');
  paragraph(
    sheet,
    "Looking downstream. Triangles mark the banks, n is Manning's roughness of the stretch, and the tinted water stands at its highest, over its full width up to the ends of the survey.",
  );
  for (let k = 0; k < caseFile.sections.length; k += ACROSS) {
    const row = caseFile.sections.slice(k, k + ACROSS);
    figure(
      sheet,
      row.map((section, i) =>
        crossSection(section, results[k + i].peaks.peakStage, facts.study.unitSystem),
      ),
      150,
      '',
      ACROSS,
    );
  }
}
