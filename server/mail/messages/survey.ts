import type { Message } from '../Mailer';

interface About {
  to: string;
  study: string;
  revision: { revision: number; fileName: string; sectionCount: number; note: string };
  by: string;
  link: string;
}

export const handedInMessage = ({ to, study, revision, by, link }: About): Message => ({
  to,
  subject: `Survey handed in: ${study}`,
  text: `${by} has handed in ${revision.fileName} for “${study}”: revision ${revision.revision}, ${revision.sectionCount} sections, read without faults.
${revision.note ? `\n${revision.note}\n` : ''}
Look at it, and accept it or return it with remarks:
${link}
`,
});

export const surveyAcceptedMessage = (about: About & { remarks: string }): Message => ({
  to: about.to,
  subject: `Survey accepted: ${about.study}`,
  text: `${about.by} has accepted revision ${about.revision.revision} of “${about.study}” (${about.revision.fileName}). There is nothing more to do for it.
${about.remarks ? `\n${about.remarks}\n` : ''}
${about.link}
`,
});

export const surveyReturnedMessage = (about: About & { remarks: string }): Message => ({
  to: about.to,
  subject: `Survey returned: ${about.study}`,
  text: `${about.by} has returned revision ${about.revision.revision} of “${about.study}” (${about.revision.fileName}):

${about.remarks}

Mend it and hand it in again:
${about.link}
`,
});
