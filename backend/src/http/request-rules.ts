import { ProblemError } from '../common/errors.js';
import { isLoopbackAddress, isLoopbackHost } from '../settings/loopback.js';
import { type Settings } from '../settings/settings.js';

/** What the rules look at; the part of a Fastify request that they need. */
export interface RequestFacts {
  method: string;
  headers: Record<string, string | string[] | undefined>;
  peer: string | undefined;
}

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);
const FORWARDING = /^(x-forwarded(-.*)?|forwarded|x-real-ip|via)$/;

/**
 * Demo mode has known passwords, so it answers only requests from this machine to this machine.
 * @throws ProblemError 403 saying how to run the server for others
 */
export function refuseFromAfar({ headers, peer }: RequestFacts, settings: Pick<Settings, 'demo'>): void {
  if (!settings.demo) return;
  const forwarded = Object.keys(headers).some((name) => FORWARDING.test(name));
  const isNear = isLoopbackHost(hostOf(headers)) && isLoopbackAddress(peer ?? '');
  if (isNear && !forwarded) return;
  const message =
    'Demo mode answers only on this machine, as localhost or 127.0.0.1, since its passwords are known. ' +
    'To serve other people, set PUBLIC_URL to the address they use and STAGEYARD_DEMO=off, then restart.';
  throw new ProblemError(403, 'demo-is-local', message);
}

/**
 * A write that a browser sends must come from our own pages. Programs send neither header and pass.
 * @throws ProblemError 403
 */
export function refuseForeignWrites(
  { method, headers }: RequestFacts,
  { publicUrl }: Pick<Settings, 'publicUrl'>,
): void {
  if (READING.has(method)) return;
  const site = headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin') throw foreignWrite();
  const { origin } = headers;
  if (origin === undefined) return;
  const host = hostOf(headers);
  const own = publicUrl === null ? [`http://${host}`, `https://${host}`] : [publicUrl, `http://${host}`];
  if (typeof origin !== 'string' || !own.includes(origin.toLowerCase())) throw foreignWrite();
}

function foreignWrite(): ProblemError {
  const message =
    'This change was sent from a page of another address, so it was refused. Open Stageyard itself and try again.';
  return new ProblemError(403, 'foreign-origin', message);
}

function hostOf(headers: RequestFacts['headers']): string {
  const { host } = headers;
  return typeof host === 'string' ? host.toLowerCase() : '';
}
