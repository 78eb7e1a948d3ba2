import { COLOUR } from '../pdf/colours';
import { room, type Sheet } from '../pdf/sheet';
import { qrCode } from '../pdf/qrCode';
import { facts as factRows } from '../pdf/table';
import { note, notice, paragraph, partHeading, tagged } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { codeText, momentText } from '../words';

const CODE = 104;

/** Who answers for it, for what exactly, and where anybody can look it up. */
export function signOff(sheet: Sheet, { facts }: RunReport): void {
  const { run, signOff: signed, withdrawal, verificationAddress } = facts;
  partHeading(sheet, 'Sign-off', 'newPage');
  const fixed = [
    ['Run', `${run.number} of "${facts.study.title}"`],
    ['Input hash', run.caseHash],
    ['Solver version', run.solverVersion],
  ] as const;
  if (!signed) {
    notice(
      sheet,
      'Not signed. No licensed engineer has taken responsibility for this result.',
      'ochre',
    );
    factRows(sheet, fixed);
    return;
  }
  if (withdrawal)
    notice(
      sheet,
      `Withdrawn by ${withdrawal.by} on ${momentText(withdrawal.at)}: ${withdrawal.reason}`,
      'brick',
    );
  paragraph(sheet, signed.statement);
  factRows(sheet, [
    ['Signed by', signed.by],
    ['Qualification', signed.qualification],
    ['Registration number', signed.registrationNumber],
    ['Signed at', momentText(signed.at)],
    ...fixed,
    ...(signed.supersedesRunNumber === null
      ? []
      : ([['Supersedes', `run ${signed.supersedesRunNumber}`]] as const)),
    ['Verification code', codeText(signed.verificationCode)],
  ]);
  const address = `${verificationAddress}/${codeText(signed.verificationCode)}`;
  const { doc, left, width } = sheet;
  room(sheet, CODE + 10);
  const y = doc.y;
  const alt = `QR code of ${address}`;
  doc.addStructure(doc.struct('Figure', { alt }, [() => qrCode(doc, address, left, y, CODE)]));
  const at = left + CODE + 12;
  doc.y = y + 14;
  tagged(sheet, 'P', () =>
    doc
      .fontSize(10)
      .fillColor(COLOUR.ink)
      .text(
        'The verification page tells whether this report stands, is withdrawn or superseded, and whether a copy of the PDF ' +
          'is the very one that was signed:',
        at,
        doc.y,
        { width: width - CODE - 12, lineGap: 2.5 },
      ),
  );
  tagged(sheet, 'Link', () =>
    doc.text(address, at, doc.y, { width: width - CODE - 12, link: address, underline: true }),
  );
  doc.x = left;
  doc.y = y + CODE + 10;
  note(
    sheet,
    'The signature is that of the named engineer in the records of the firm; whether it satisfies the law of the place is for the local rules of practice.',
  );
}
