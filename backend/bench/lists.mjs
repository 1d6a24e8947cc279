import { inMs, printTable, times } from '../../libs/bench/timing.mjs';
import { openBare } from './bare-list.mjs';

const SIZE = 100;
const GOAL = 3;
/** Rounds of one list; each starts with a change, so that nothing kept of an earlier round helps. */
const ROUNDS = 8;
const AGAIN = 3;

const MATCH = `"id" IN (SELECT "rowid" FROM "part_search" WHERE "part_search" MATCH ?)`;

/** What people ask for, as a query of the API and in SQL. */
const LISTS = [
  { name: 'all, by number', query: {}, order: '"number", "id"' },
  { name: 'gears, heaviest first', query: {kind: 'gear', sort: '-mass'}, where: '"kind" = ?', values: ['gear'], order: '"mass" DESC NULLS LAST, "id" DESC' },
  {
    name: 'gears of module 2, 20 to 60 teeth, by teeth',
    query: {kind: 'gear', module: 2, teethMin: 20, teethMax: 60, sort: 'teeth'},
    where: '"kind" = ? AND "module" = ? AND "teeth" >= ? AND "teeth" <= ?',
    values: ['gear', 2, 20, 60],
    order: '"teeth" NULLS LAST, "id"',
  },
  { name: 'cleared, last changed first', query: {standing: 'cleared', sort: '-updatedAt'}, where: '"standing" = ?', values: ['cleared'], order: '"updatedAt" DESC, "id" DESC' },
  { name: 'all, by module, most teeth first', query: {sort: 'module,-teeth'}, order: '"module" NULLS LAST, "teeth" DESC NULLS LAST, "id" DESC' },
  {
    name: 'of C45, by face width and bore',
    query: {material: 'C45', sort: 'faceWidth,-bore'},
    where: '"material" = ?',
    values: ['C45'],
    order: '"faceWidth" NULLS LAST, "bore" DESC NULLS LAST, "id" DESC',
  },
  { name: 'with the word “acetal”, heaviest first', query: {text: 'acetal', sort: '-mass'}, where: MATCH, values: ['"acetal"'], order: '"mass" DESC NULLS LAST, "id" DESC' },
]; // prettier-ignore

/** Times every list, first page and last, against the bare query. @returns whether both gave the same rows everywhere */
export async function benchLists(server) {
  const bare = openBare(server.dataDir);
  const rows = [];
  let same = true;
  let worst = 0;
  server.tell({ kind: 'watch' });
  try {
    for (const list of LISTS) {
      const read = bare.list(list, SIZE);
      // The last full page: a rest of a few rows would be no page like the others.
      const last = Math.max(1, Math.floor(read(1).total / SIZE));
      for (const [where, page] of [
        ['first', 1],
        ['last', last],
      ]) {
        const found = await timeList(server, read, list, page);
        same &&= found.same;
        const ratios = [found.changed, found.again].map((best) => best.list / best.bare);
        worst = Math.max(worst, ...ratios);
        rows.push(row(`${list.name}: ${where} page`, found, ratios));
      }
    }
  } finally {
    bare.close();
  }
  const { loop } = await server.ask({ kind: 'watched' }, 'loop');
  console.log(
    `Lists of parts, ${SIZE} a page, against the bare query through the driver (shortest of ${ROUNDS} rounds)`,
  );
  printTable([HEAD, ...rows]);
  console.log(
    `“list” is what the route calls, in the server; “again” is the same page with nothing changed since, for which the\n` +
      `server keeps its count; over HTTP come sign-in, JSON and the network on top. Worst ratio ${times(worst)} (goal ` +
      `${GOAL} ×).\nLongest hold of the server's loop meanwhile ${inMs(loop.hold)} (goal 50 ms); longest gap, waiting for a ` +
      `processor included, ${inMs(loop.gap)}.\n`,
  );
  return same;
}

const HEAD = [
  '',
  'bare',
  'list',
  'ratio',
  'bare again',
  'list again',
  'ratio',
  'HTTP',
  'HTTP again',
  'within 3 ×',
  'same rows',
];

function row(name, { changed, again, same }, ratios) {
  const cells = [changed, again].flatMap((best, index) => [
    inMs(best.bare),
    inMs(best.list),
    times(ratios[index]),
  ]);
  const verdict = ratios.every((ratio) => ratio <= GOAL) ? 'yes' : 'NO';
  return [name, ...cells, inMs(changed.http), inMs(again.http), verdict, same ? 'yes' : 'NO'];
}

/** One list in three ways, each way first after a change and then again. */
async function timeList(server, read, { query }, page) {
  const place = `/api/parts?${new URLSearchParams({ ...query, size: SIZE, page })}`;
  const ways = {
    async bare() {
      const started = performance.now();
      const { items, total } = read(page);
      const ms = performance.now() - started;
      return { ms, total, numbers: items.map(({ number }) => number) };
    },
    list: () => server.ask({ kind: 'list', query: { ...query, size: SIZE, page } }, 'listed'),
    async http() {
      const { body, ms } = await server.request('GET', place);
      return { ms, total: body.total, numbers: body.items.map(({ number }) => number) };
    },
  };
  const nothing = () => ({ bare: Infinity, list: Infinity, http: Infinity });
  const [changed, again] = [nothing(), nothing()];
  const answers = new Set();
  for (let round = 0; round < ROUNDS; round += 1) {
    for (const [name, way] of Object.entries(ways)) {
      await change(server);
      for (let turn = 0; turn <= AGAIN; turn += 1) {
        const { ms, total, numbers } = await way();
        const best = turn === 0 ? changed : again;
        best[name] = Math.min(best[name], ms);
        answers.add(`${total} ${numbers}`);
      }
    }
  }
  return { changed, again, same: answers.size === 1 };
}

/** Changes a part's note: whatever the server keeps of earlier answers is out of date then. */
async function change(server) {
  const { body } = await server.request('GET', '/api/parts/BENCH-1');
  await server.request('PATCH', '/api/parts/BENCH-1', { version: body.version, note: `${body.version}` });
}
