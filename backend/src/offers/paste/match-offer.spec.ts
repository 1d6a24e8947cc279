import { describe, expect, it } from 'vitest';
import { type Supplier } from '../../suppliers/entities/supplier.entity.js';
import { type Offer } from '../entities/offer.entity.js';
import { groupRows } from './group-rows.js';
import { matchOffer } from './match-offer.js';
import { type PastedPart, type PasteGround } from './paste-ground.js';
import { readRow } from './read-row.js';

const TODAY = '2026-06-15';
const part = { id: 7, number: 'KW-00007' } as PastedPart;

const open = (id: number, changes: Partial<Offer> = {}): Offer =>
  ({ id, partId: 7, supplierPartNumber: '', validFrom: '2026-01-01', ...changes }) as Offer;

function match(offers: Offer[], cells: { number?: string; validFrom?: string } = {}) {
  const ground: PasteGround = {
    supplier: { code: 'S-0001' } as Supplier,
    parts: new Map(),
    bySupplierNumber: new Map(),
    offers: new Map([[7, offers]]),
    today: TODAY,
  };
  const row = readRow(
    {
      row: 1,
      cells: {
        partNumber: part.number,
        price: '2.00',
        ...(cells.number && { supplierPartNumber: cells.number }),
        ...(cells.validFrom && { validFrom: cells.validFrom }),
      },
      series: [],
      spare: [],
    },
    { stated: undefined, usual: 'EUR' },
  );
  const [stated] = groupRows([row]);
  if (!stated) throw new Error('One offer was stated.');
  const { before, beside, problem } = matchOffer(stated, part, ground, undefined);
  return { before: before?.id ?? null, beside: beside?.id ?? null, wrong: problem !== null };
}

describe('the offer that pasted rows change', () => {
  it.each([
    ['none where there is none', [], {}, null],
    ['the only one, where the rows name no number', [open(1, { supplierPartNumber: 'A1' })], {}, 1],
    [
      'the one of the same number in any case',
      [open(1), open(2, { supplierPartNumber: 'A1' })],
      { number: 'a1' },
      2,
    ],
    [
      'the one without a number, where none has it',
      [open(1), open(2, { supplierPartNumber: 'A1' })],
      { number: 'B2' },
      1,
    ],
    ['none where all have other numbers', [open(2, { supplierPartNumber: 'A1' })], { number: 'B2' }, null],
    ['the present one of two, where no day is said', [open(1), open(2, { validFrom: '2026-09-01' })], {}, 1],
    [
      'the one that starts that day',
      [open(1), open(2, { validFrom: '2026-09-01' })],
      { validFrom: '2026-09-01' },
      2,
    ],
  ])('is %s', (_, offers, cells, id) => {
    expect(match(offers, cells)).toEqual({ before: id, beside: null, wrong: false });
  });

  it('stays as it is where the rows start later', () => {
    expect(match([open(1)], { validFrom: '2026-07-01' })).toEqual({ before: null, beside: 1, wrong: false });
  });

  it('is not guessed where two hold today', () => {
    expect(match([open(1), open(2)])).toEqual({ before: null, beside: null, wrong: true });
  });
});
