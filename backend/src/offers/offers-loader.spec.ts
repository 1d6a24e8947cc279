import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ProblemError } from '../common/errors.js';
import { WriteQueue } from '../database/write-queue.js';
import { PartsService } from '../parts/parts.service.js';
import { SuppliersService } from '../suppliers/suppliers.service.js';
import { copyPart } from '../testing/copy-part.js';
import { longestTurn } from '../testing/longest-turn.js';
import { newOffer, newSupplier } from '../testing/new-offer.js';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { OfferReader } from './offer-reader.js';
import { OffersFinder } from './offers-finder.service.js';
import { OffersLoader } from './offers-loader.js';

let library: TempLibrary;
let loader: OffersLoader;
let reader: OfferReader;
let finder: OffersFinder;
let parts: string[];
let supplierCode: string;
beforeAll(async () => {
  library = await openTempLibrary();
  loader = library.module.get(OffersLoader);
  reader = library.module.get(OfferReader);
  finder = library.module.get(OffersFinder);
  const { number } = await library.module
    .get(PartsService)
    .create(LIBRARIAN, newGear({ standing: 'cleared' }));
  parts = await library.module.get(WriteQueue).run((manager) => copyPart(manager, number, 1000));
  ({ code: supplierCode } = await library.module.get(SuppliersService).create(LIBRARIAN, newSupplier()));
});
afterAll(() => library.close());

const offers = (count: number) =>
  Array.from({ length: count }, (_, index) =>
    newOffer({
      partNumber: parts[index % parts.length] ?? '',
      supplierCode,
      supplierPartNumber: `N-${index}`,
      breaks: [{ quantity: 1, unitPrice: index + 1 }],
    }),
  );

describe('adding many offers', () => {
  it('keeps their order, each with its own row on record', async () => {
    const ids = await loader.createMany(LIBRARIAN, offers(260));
    expect(new Set(ids).size).toBe(260);
    const last = await reader.get(ids[259] ?? '');
    expect(last).toMatchObject({ supplierPartNumber: 'N-259', breaks: [{ quantity: 1, unitPrice: 260 }] });
    expect((await reader.changes(last.id, {})).items).toMatchObject([
      { action: 'added', by: LIBRARIAN.name },
    ]);
  });

  it('keeps nobody waiting for more than 50 ms', async () => {
    await loader.createMany(LIBRARIAN, offers(200));
    const { result, longest } = await longestTurn(() => loader.createMany(LIBRARIAN, offers(3000)));
    expect(result).toHaveLength(3000);
    expect(longest).toBeLessThan(50);
  });

  it.each([
    ['a price of half a cent', { breaks: [{ quantity: 1, unitPrice: 0.5 }] }, 'offers.1.breaks.0.unitPrice'],
    ['an end before its start', { validFrom: '2026-02-02', validUntil: '2026-02-01' }, 'offers.1.validUntil'],
    ['an unknown part', { partNumber: 'NOBODY' }, 'offers.1.partNumber'],
    ['an unknown supplier', { supplierCode: 'S-9999' }, 'offers.1.supplierCode'],
  ])('adds nothing when one of them has %s, and names it', async (_, changes, field) => {
    const before = (await reader.page({})).total;
    const [good, other] = offers(2);
    if (!good || !other) throw new Error('Two offers were asked for.');
    const thrown: unknown = await loader
      .createMany(LIBRARIAN, [good, { ...other, ...changes }])
      .catch((error: unknown) => error);
    expect((thrown as ProblemError).errors?.map((issue) => issue.field)).toEqual([field]);
    expect((await reader.page({})).total).toBe(before);
  });
});

describe('finding the offers of many parts', () => {
  it('answers by the numbers as they were asked for, and leaves out what has none', async () => {
    const [first = '', second = ''] = parts;
    const asked = [first.toLowerCase(), second, 'NOBODY', first];
    const found = await finder.forParts(asked);
    expect([...found.keys()].sort()).toEqual([first.toLowerCase(), second, first].sort());
    expect(found.get(first)).toBe(found.get(first.toLowerCase()));
    expect(found.get(second)?.[0]).toMatchObject({
      supplierCode,
      supplierPartNumber: 'N-1',
      supplierStanding: 'active',
      supplierLeadTimeDays: 14,
      leadTimeDays: null,
      breaks: [{ quantity: 1, unitPrice: 2 }],
      standing: 'open',
    });
    expect(await finder.forParts([])).toEqual(new Map());
  });
});
