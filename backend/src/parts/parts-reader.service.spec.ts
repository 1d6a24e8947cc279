import { DataSource } from 'typeorm';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { ReadThreads } from '../database/read-threads.js';
import { WriteQueue } from '../database/write-queue.js';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { PART_SORTS } from './dto/part-list-query.dto.js';
import { Part } from './entities/part.entity.js';
import { PartsLoader } from './parts-loader.service.js';
import { PartsReader } from './parts-reader.service.js';

let library: TempLibrary;
let reader: PartsReader;
let source: DataSource;
beforeAll(async () => {
  library = await openTempLibrary();
  reader = library.module.get(PartsReader);
  source = library.module.get(DataSource);
  const inputs = Array.from({ length: 60 }, (_, index) =>
    newGear({
      number: `P-${String(index).padStart(2, '0')}`,
      description: index % 2 ? 'Winch gear' : 'Vent gear',
      mass: index % 7 ? 1 + (index % 5) : null,
      attributes: { teeth: 12 + (index % 10), module: 1 + (index % 3), bore: 6 },
    }),
  );
  await library.module.get(PartsLoader).createMany(LIBRARIAN, inputs);
});
afterAll(() => library.close());

/** How the database would go about the statements that a call sends to the reading threads. */
async function plansOf(act: () => Promise<unknown>): Promise<string[]> {
  const sent = vi.spyOn(library.module.get(ReadThreads), 'read');
  await act();
  const statements = sent.mock.calls.flat();
  sent.mockRestore();
  const plans: string[] = [];
  for (const { sql, params } of statements) {
    const rows = await source.query<{ detail: string }[]>(`EXPLAIN QUERY PLAN ${sql}`, [...params]);
    plans.push(rows.map(({ detail }) => detail).join('\n'));
  }
  return plans;
}

describe('the list of parts', () => {
  it.each(PART_SORTS.flatMap((sort) => [sort, `-${sort}`]))(
    'walks an index to sort by %s instead of sorting the library',
    async (sort) => {
      const plans = await plansOf(() => reader.list({ sort }));
      expect(plans.length).toBeGreaterThan(1);
      expect(plans.join('\n')).not.toContain('TEMP B-TREE');
    },
  );

  it('looks words up in the text index, and numbers and kinds in theirs', async () => {
    const [text] = await plansOf(() => reader.list({ text: 'winch' }));
    expect(text).toContain('VIRTUAL TABLE INDEX');
    const [kind] = await plansOf(() => reader.list({ kind: 'gear', module: 2, teethMin: 14, teethMax: 15 }));
    expect(kind).toContain('part_kind_tooth (kind=? AND module=? AND teeth>? AND teeth<?)');
    const byNumber = source.getRepository(Part).createQueryBuilder().where({ number: 'P-01' });
    const [sql, params] = byNumber.getQueryAndParameters();
    const [number] = await source.query<{ detail: string }[]>(`EXPLAIN QUERY PLAN ${sql}`, params);
    expect(number?.detail).toContain('part_number_unique (number=?)');
  });

  it('holds every part exactly once over its pages, however it is sorted', async () => {
    for (const sort of ['mass', '-mass', 'module,-teeth', '-description,mass']) {
      const pages = [];
      for (let page = 1; page <= 7; page++) pages.push((await reader.list({ sort, page, size: 9 })).items);
      expect(new Set(pages.flat().map(({ number }) => number)).size).toBe(60);
    }
  });

  it('follows a change of the text it searches', async () => {
    const queue = library.module.get(WriteQueue);
    await queue.run((manager) =>
      manager.query(`UPDATE "part" SET "description" = 'Turntable gear' WHERE "number" = 'P-00'`),
    );
    expect((await reader.list({ text: 'turntable' })).items.map(({ number }) => number)).toEqual(['P-00']);
    expect((await reader.list({ text: 'vent' })).total).toBe(29);
  });
});

describe('finding parts for the header', () => {
  it('gives numbers that begin with the text first, then descriptions, at most the limit', async () => {
    expect((await reader.find('p-0', 4)).map(({ number }) => number)).toEqual([
      'P-00',
      'P-01',
      'P-02',
      'P-03',
    ]);
    expect(await reader.find('winch', 8)).toHaveLength(8);
    expect((await reader.find('-59', 8)).map(({ number }) => number)).toEqual(['P-59']);
    expect(await reader.find('nothing like it', 8)).toEqual([]);
  });
});
