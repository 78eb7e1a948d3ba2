import type { Request, RequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import type { ErrorCode } from '../../shared/errors';
import type { Actor } from '../policies/subject';
import type { Audit, AuditEntry } from './buildAudit';
import { requestContext, type RequestContext } from './requestContext';
import { NOT_TOLD, ROUTE_WORDS } from './routeWords';

/** Errors that tell of a refusal; faults of typing and limits of rate are none. */
const REFUSALS = new Set<ErrorCode>([
  'signInFailed',
  'forbidden',
  'notFound',
  'conflict',
  'gone',
  'surveyRefused',
  'scenarioIncomplete',
]);

/**
 * Sees to it that every change, download and refusal leaves a row: where the services have written none in their own
 * transaction, one is written before the answer leaves.
 */
export const followRequests =
  (audit: Audit, log: Logger): RequestHandler =>
  (req, res, next) => {
    const context: RequestContext = {
      address: req.ip ?? null,
      actor: () => res.locals['actor'] as Actor | undefined,
      noted: false,
    };
    const end = res.end;
    const finish = async () => {
      const entry = context.noted ? null : entryOf(req, res);
      if (!entry) return;
      await audit
        .note(entry)
        .catch((error: unknown) => log.error({ err: error, entry }, 'the audit trail has a gap'));
    };
    res.end = function endAfterNote(this: Response, ...args: unknown[]) {
      res.end = end;
      const answer = () => (end as (...given: unknown[]) => Response).apply(res, args);
      if (context.noted || !entryOf(req, res)) return answer();
      void requestContext.run(context, finish).then(answer);
      return res;
    } as typeof res.end;
    // Broken off half-way: what was taken was taken.
    res.once('close', () => {
      if (res.end !== end && res.headersSent) void requestContext.run(context, finish);
    });
    requestContext.run(context, next);
  };

function entryOf(req: Request, res: Response): AuditEntry | null {
  const path = (req.route as { path?: string } | undefined)?.path;
  if (!path) return null;
  const name = `${req.method} ${path}`;
  if (NOT_TOLD.has(name)) return null;
  const told = ROUTE_WORDS[name];
  const record = recordOf(res);
  const words = told && detailed(told.words, res);
  if (res.statusCode < 400) {
    // An answer that nothing is new gives nothing away.
    if (!told || res.statusCode === 304) return null;
    return { action: told.action, words: join(words!, nameOf(res)), record };
  }
  const code = res.locals['errorCode'] as ErrorCode | undefined;
  const refused = told ? code && REFUSALS.has(code) : res.locals['refused'];
  if (!refused) return null;
  const action = told?.action ?? `${String(res.locals['action'] ?? 'page')}`;
  const what = join(words ?? `Looking at ${req.originalUrl.split('?')[0]}`, nameOf(res));
  return { action, words: `${what}: refused (${res.statusCode})`, record, outcome: 'refused' };
}

/** With what the route alone knows of its answer. */
const detailed = (words: string, { locals }: Response): string =>
  locals['detail'] ? `${words} ${String(locals['detail'])}` : words;

const join = (words: string, name: string | null) => (name ? `${words}: ${name}` : words);

/** The last id in the address, by the name of its place: `runId` is a run. */
function recordOf(res: Response): AuditEntry['record'] {
  const params = Object.entries((res.locals['params'] ?? {}) as Record<string, string>);
  const last = params.filter(([key]) => key.endsWith('Id')).at(-1);
  const id = Number(last?.[1]);
  if (!last || !Number.isSafeInteger(id) || id <= 0) return null;
  return { kind: last[0].slice(0, -2), id };
}

/** How people call the record that a route is about. */
function nameOf(res: Response): string | null {
  const record = res.locals['record'] as Record<string, unknown> | null | undefined;
  if (!record) return null;
  if (typeof record['scenarioName'] === 'string')
    return `run ${String(record['number'])}, ${record['scenarioName']}`;
  const named = record['title'] ?? record['name'] ?? record['email'] ?? record['fileName'];
  return typeof named === 'string' ? named : null;
}
