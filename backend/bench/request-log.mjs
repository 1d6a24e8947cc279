import { setTimeout as pause } from 'node:timers/promises';

const READS = [
  '/api/parts?size=100',
  '/api/parts?kind=gear&sort=-mass&size=100',
  '/api/parts?sort=module,-teeth&page=20&size=100',
  '/api/parts?text=helical&size=50',
  '/api/parts?standing=cleared&sort=-updatedAt&size=100',
  '/api/parts/facets',
  '/api/parts/BENCH-1',
];
const READ_EVERY_MS = 100;
const WRITE_EVERY_MS = 250;

/**
 * Two people who each ask for another page a tenth of a second after the last, and one who changes a part four times a
 * second.
 * @returns ends it and gives the log: `{ kind, status, ms }` of every request
 */
export async function keepAsking(server) {
  const log = [];
  const part = {
    number: 'BENCH-1',
    kind: 'other',
    description: 'Changed while the bench loads',
    attributes: {},
  };
  const added = await server.request('POST', '/api/parts', part);
  if (added.status !== 201) throw new Error(`The bench cannot add its part: ${added.status}`);
  let asking = true;
  const note = (kind, { status, ms }) => log.push({ kind, status, ms });
  async function read(start) {
    for (let turn = start; asking; turn += 1) {
      note('read', await server.request('GET', READS[turn % READS.length]));
      await pause(READ_EVERY_MS);
    }
  }
  async function write() {
    for (let version = 1; asking; version += 1) {
      const change = { version, note: `Change ${version}` };
      note('write', await server.request('PATCH', '/api/parts/BENCH-1', change));
      await pause(WRITE_EVERY_MS);
    }
  }
  const clients = [read(0), read(3), write()];
  return async () => {
    asking = false;
    await Promise.all(clients);
    return log;
  };
}

/** Count, refusals and latencies of one kind of request. */
export function summary(log, kind) {
  const times = log
    .filter((entry) => entry.kind === kind)
    .map(({ ms }) => ms)
    .sort((a, b) => a - b);
  const at = (share) => times[Math.min(times.length - 1, Math.floor(times.length * share))] ?? 0;
  const refused = log.filter((entry) => entry.kind === kind && entry.status !== 200).length;
  return { count: times.length, refused, p50: at(0.5), p99: at(0.99), max: times.at(-1) ?? 0 };
}
