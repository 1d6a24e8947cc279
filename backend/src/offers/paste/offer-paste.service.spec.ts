import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { WriteQueue } from '../../database/write-queue.js';
import { PartsService } from '../../parts/parts.service.js';
import { SuppliersService } from '../../suppliers/suppliers.service.js';
import { copyPart } from '../../testing/copy-part.js';
import { longestTurn } from '../../testing/longest-turn.js';
import { newSupplier } from '../../testing/new-offer.js';
import { LIBRARIAN, newGear } from '../../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../../testing/temp-library.js';
import { OfferPaste } from './offer-paste.service.js';

let library: TempLibrary;
let paste: OfferPaste;
let parts: string[];
beforeAll(async () => {
  library = await openTempLibrary();
  paste = library.module.get(OfferPaste);
  const { number } = await library.module
    .get(PartsService)
    .create(LIBRARIAN, newGear({ standing: 'cleared' }));
  parts = await library.module.get(WriteQueue).run((manager) => copyPart(manager, number, 2000));
});
afterAll(() => library.close());

async function addSupplier(): Promise<string> {
  return (await library.module.get(SuppliersService).create(LIBRARIAN, newSupplier())).code;
}

const list = (count: number, cents: string) =>
  parts
    .slice(0, count)
    .map((number, index) => `${number}\tN-${index}\t1\t${index + 1}.${cents}\tEUR`)
    .join('\n');

async function previewAndBook(supplierCode: string, text: string) {
  const { token } = await paste.preview({ supplierCode, text });
  return paste.book(LIBRARIAN, { supplierCode, text, token, leaveOutWrong: false });
}

describe('pasting a price list', () => {
  it.each([
    [500, 50],
    [2000, 100],
  ])('of %s rows keeps nobody waiting for more than %s ms', async (count, most) => {
    await previewAndBook(await addSupplier(), list(100, '00'));
    const supplierCode = await addSupplier();
    const added = await longestTurn(() => previewAndBook(supplierCode, list(count, '10')));
    expect(added.result).toEqual({ added: count, changed: 0, same: 0, leftOut: 0 });
    const changed = await longestTurn(() => previewAndBook(supplierCode, list(count, '20')));
    expect(changed.result).toEqual({ added: 0, changed: count, same: 0, leftOut: 0 });
    expect(Math.max(added.longest, changed.longest)).toBeLessThan(most);
  });
});
