import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PartsLoader } from '../parts/parts-loader.service.js';
import { StockService } from '../stock/stock.service.js';
import { addOffer, addSupplier } from '../testing/add-offer.js';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { type GearNeed, StockGears } from './stock-gears.service.js';

let temp: TempApp;

const gear = (number: string, attributes: object, standing: 'draft' | 'cleared' = 'cleared') =>
  newGear({ number, standing, attributes });
const need = (changes: Partial<GearNeed> = {}): GearNeed => ({
  module: 2,
  teeth: 24,
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  hand: null,
  profileShift: 0,
  faceWidth: 20,
  wanted: 1,
  ...changes,
});
const match = async (...needs: GearNeed[]) =>
  (await temp.app.get(StockGears).matchMany(needs)).map((found) => found?.number ?? null);

beforeAll(async () => {
  temp = await openTempApp();
  await temp.app.get(PartsLoader).createMany(LIBRARIAN, [
    // Three of the very same gear: the narrowest, one that is offered, and one that lies on the shelf.
    gear('A-NARROW', { faceWidth: 20 }),
    gear('B-OFFERED', { faceWidth: 22 }),
    gear('C-SHELF', { faceWidth: 25 }),
    gear('D-LAPSED', { teeth: 30, faceWidth: 20, bore: 10 }),
    gear('E-PLAIN', { teeth: 30, faceWidth: 20, bore: 12 }),
    gear('F-DRAFT', { teeth: 31 }, 'draft'),
    gear('G-LEFT', { teeth: 40, helixAngleDeg: 15, hand: 'left' }),
    gear('H-SHIFTED', { teeth: 40, profileShift: 0.3 }),
    gear('I-INCH', { teeth: 24, module: 25.4 / 12, faceWidth: 20 }),
  ]);
  const { code } = await addSupplier(temp.app);
  await addOffer(temp.app, 'B-OFFERED', code);
  await addOffer(temp.app, 'E-PLAIN', code, { validUntil: '2020-12-31' });
  const book = (number: string, quantity: number, place: string) =>
    temp.app.get(StockService).book(LIBRARIAN, { number, kind: 'received', quantity, place });
  await book('C-SHELF', 20, 'Rack A 1');
  await book('C-SHELF', 10, 'Rack A 2');
});
afterAll(() => temp.close());

describe('among equal stock gears', () => {
  it('one is taken whose shelf covers the need, over all its places', async () => {
    expect(await match(need({ wanted: 30 }))).toEqual(['C-SHELF']);
  });

  it('else one with a valid offer, else the narrowest, else the lowest number', async () => {
    expect(await match(need({ wanted: 31 }))).toEqual(['B-OFFERED']);
    // The offer of E-PLAIN ended: both are equal, and D comes before E.
    expect(await match(need({ teeth: 30, wanted: 31 }))).toEqual(['D-LAPSED']);
    // Half as wide again is the most that is taken by itself: 25 > 1.5 × 16, 22 is not.
    expect(await match(need({ faceWidth: 16, wanted: 30 }))).toEqual(['B-OFFERED']);
  });

  it('says what lies on the shelf', async () => {
    const [found] = await temp.app.get(StockGears).matchMany([need()]);
    expect(found).toEqual({ number: 'C-SHELF', bore: 12, onShelf: 30 });
  });
});

describe('a stock gear', () => {
  it('has the very data asked for, and is cleared', async () => {
    expect(
      await match(
        need({ teeth: 31 }),
        need({ module: 2.5 }),
        need({ pressureAngleDeg: 25 }),
        need({ profileShift: 0.1 }),
        need({ faceWidth: 26 }),
        need({ teeth: 40, helixAngleDeg: 15, hand: 'right' }),
        need({ teeth: 40, helixAngleDeg: 15, hand: 'left' }),
        need({ teeth: 40, profileShift: 0.3 }),
        need({ teeth: 40 }),
      ),
    ).toEqual([null, null, null, null, null, null, 'G-LEFT', 'H-SHIFTED', null]);
  });

  it('is found by a module that differs in the last digits only', async () => {
    expect(await match(need({ module: 2.1166667 }))).toEqual(['I-INCH']);
  });

  it('is found for many needs as for one, in their order', async () => {
    const many = Array.from({ length: 230 }, (_, index) => need({ teeth: index % 2 === 0 ? 24 : 30 }));
    const found = await match(...many);
    expect(found).toEqual(many.map((_, index) => (index % 2 === 0 ? 'C-SHELF' : 'D-LAPSED')));
    expect(await match()).toEqual([]);
  });
});
