import type { Message } from '../Mailer';

interface About {
  to: string;
  /** How people call the run. */
  run: string;
  by: string;
  link: string;
}

export const sentForCheckMessage = ({ to, run, by, link }: About): Message => ({
  to,
  subject: `To check: ${run}`,
  text: `${by} has sent ${run}, for checking.

Look for what is wrong, and sign or return it here:
${link}
`,
});

export const sentConfirmedMessage = ({ to, run, by, link }: About): Message => ({
  to,
  subject: `In check: ${run}`,
  text: `${by} has sent ${run}, for checking. You will be told when it is returned or signed.

${link}
`,
});

export const returnedMessage = (about: About & { reason: string }): Message => ({
  to: about.to,
  subject: `Returned: ${about.run}`,
  text: `${about.by} has returned ${about.run}:

${about.reason}

Answer the points and send it again, or ask for a new run:
${about.link}
`,
});

export const signedMessage = ({ to, run, by, link }: About): Message => ({
  to,
  subject: `Signed: ${run}`,
  text: `${by} has signed ${run}. Nothing of it changes any more; it can be issued to the client here:
${link}
`,
});

export const issuedMessage = (
  about: About & { studyTitle: string; firmName: string; message: string },
): Message => ({
  to: about.to,
  subject: `Result issued: ${about.studyTitle}`,
  text: `${about.firmName} has issued a result of “${about.studyTitle}” to you, signed by ${about.by}.
${about.message ? `\n${about.message}\n` : ''}
Read it, with the signed report, here:
${about.link}

It is no flood warning. In an emergency follow the local authority.
`,
});

export const withdrawnMessage = (
  about: About & { studyTitle: string; reason: string },
): Message => ({
  to: about.to,
  subject: `Withdrawn, do not use: ${about.studyTitle}`,
  text: `${about.by} has withdrawn the signature of ${about.run}. Do not use this result or its report any longer.

The reason:
${about.reason}

${about.link}
`,
});
