import type { CaseFile } from '../../../shared/case/caseFile';
import { ROUGHNESS_SOURCE } from '../../../shared/reaches/roughnessTable';
import { arrivalRule } from '../../../shared/runs/arrivalRule';
import { sayIn } from '../../../shared/units/message';
import type { UnitSystem } from '../../../shared/units/units';
import type { Sheet } from '../pdf/sheet';
import { heading, list, paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';

/** Half a page: what is solved, how, and by whom it was published. */
export function method(sheet: Sheet, { caseFile, facts, run }: RunReport): void {
  partHeading(sheet, 'Method', 'flowing');
  paragraph(
    sheet,
    'The equations of Saint-Venant for unsteady flow in one dimension, conservation of volume and of momentum with ' +
      "Manning's friction, are solved on the surveyed cross-sections. Each section is one water level and one mean " +
      `velocity; conveyance, ${conveyanceText(facts.study.unitSystem)}, is summed over its roughness zones. ${momentumSentence(caseFile)}`,
  );
  paragraph(
    sheet,
    'The reach is cut into equal cells of a finite-volume scheme of second order in space and time. Stage and flow are ' +
      "reconstructed with van Leer's limiter, fluxes between cells are those of Harten, Lax and van Leer, time is stepped by " +
      "Heun's method with friction taken implicitly as it stiffens. Water at rest over an uneven bed stays at rest, cells may " +
      'dry and be wetted again, and passages between subcritical and supercritical flow and hydraulic jumps are part of the ' +
      'solution. The time step follows the Courant condition.',
  );
  paragraph(
    sheet,
    `Arrival is told by this rule: ${sayIn(facts.study.unitSystem, arrivalRule(run.arrivalThreshold))} Peaks are taken over every time step, not over the output ` +
      `times alone. Solver version ${facts.run.solverVersion}: the same case gives the same result.`,
  );
  heading(sheet, 'Sources');
  list(sheet, [
    'A. Harten, P. D. Lax, B. van Leer (1983), On upstream differencing and Godunov-type schemes, SIAM Review 25, 35–61.',
    'B. van Leer (1974), Towards the ultimate conservative difference scheme II, J. Comput. Phys. 14, 361–370.',
    'C.-W. Shu, S. Osher (1988), Efficient implementation of essentially non-oscillatory schemes, J. Comput. Phys. 77, 439–471.',
    'E. F. Toro (2001), Shock-Capturing Methods for Free-Surface Shallow Flows, Wiley.',
    `${ROUGHNESS_SOURCE} (Manning's n).`,
  ]);
}

/** The same n in both systems: a foot is 0.3048 m, and 0.3048 to the power of −1/3 is 1.486. */
const conveyanceText = (system: UnitSystem): string =>
  system === 'metric' ? 'A R^(2/3) / n' : '1.486 A R^(2/3) / n in feet and seconds';

const momentumSentence = ({ numerics }: CaseFile): string =>
  numerics.momentum === 'compound'
    ? 'The momentum coefficient follows from the conveyances of channel and flood plains.'
    : 'The momentum coefficient is taken as 1.';
