import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { describe, expect, it } from 'vitest';
import { OfferInputDto } from '../offers/dto/offer-input.dto.js';
import { PriceBreakDto } from '../offers/dto/price-break.dto.js';
import { GearAttributes } from '../parts/dto/attributes/gear-attributes.js';
import { PartInputDto } from '../parts/dto/part-input.dto.js';
import { MovementInputDto } from '../stock/dto/movement-input.dto.js';
import { checkedInput, type QuickCheck, quickCheck } from './quick-check.js';

interface Case {
  type: new () => object;
  quick: QuickCheck<object>;
  good: Record<string, unknown>;
}

const CASES: [string, Case][] = [
  [
    'a part',
    {
      type: PartInputDto,
      quick: quickCheck(PartInputDto),
      good: {
        number: 'KW-1',
        kind: 'gear',
        description: 'Spur gear',
        standing: 'cleared',
        material: 'C45',
        mass: 0.2,
        supply: 'bought',
        supplier: null,
        note: '',
        attributes: {},
      },
    },
  ],
  [
    'the attributes of a gear',
    {
      type: GearAttributes,
      quick: quickCheck(GearAttributes),
      good: {
        teeth: 24,
        module: 2,
        faceWidth: 20,
        bore: 12,
        helixAngleDeg: 0,
        hand: null,
        hardness: '58 HRC',
      },
    },
  ],
  [
    'an offer',
    {
      type: OfferInputDto,
      quick: quickCheck(OfferInputDto, { breaks: quickCheck(PriceBreakDto) }),
      good: {
        partNumber: 'KW-1',
        supplierCode: 'S-0001',
        currency: 'EUR',
        per: 100,
        breaks: [
          { quantity: 1, unitPrice: 250 },
          { quantity: 10, unitPrice: 200 },
        ],
        pack: 5,
        leadTimeDays: null,
        validFrom: '2026-01-31',
        validUntil: null,
      },
    },
  ],
  [
    'a movement',
    {
      type: MovementInputDto,
      quick: quickCheck(MovementInputDto),
      good: { number: 'KW-1', kind: 'counted', quantity: 3, place: 'Rack A 1' },
    },
  ],
];

/** What people and files put into fields. */
const VALUES: unknown[] = [
  undefined, null, '', ' ', ' padded ', 'eur', 'x'.repeat(20_000), 'two\nlines', 'KW 1', '2026-02-30',
  -1, 0, 0.0001, 1.5, 1e12, NaN, Infinity, true, [], {}, [null], [1],
  [{ quantity: 0, unitPrice: 1 }], [{ quantity: 1, unitPrice: 1.5 }], [{ quantity: 1, unitPrice: 1, more: 1 }],
]; // prettier-ignore

function longCheck({ type }: Case, raw: object): { input: object; passes: boolean } {
  const input = plainToInstance(type, raw, { exposeUnsetFields: false });
  const options = { whitelist: true, forbidNonWhitelisted: true, forbidUnknownValues: false };
  return { input, passes: validateSync(input, options).length === 0 };
}

const plain = (value: object): unknown => JSON.parse(JSON.stringify(value));

describe.each(CASES)('the quick check of %s', (_, one) => {
  it('settles a good input by itself, as the long check would', () => {
    const settled = one.quick(one.good);
    expect(settled).not.toBeNull();
    expect(settled).toBeInstanceOf(one.type);
    expect(plain(settled ?? {})).toEqual(plain(longCheck(one, one.good).input));
    expect(longCheck(one, one.good).passes).toBe(true);
  });

  it('never passes what the long check refuses, whatever stands in a field', () => {
    let passed = 0;
    let refused = 0;
    for (const field of [...Object.keys(one.good), 'colour']) {
      for (const value of VALUES) {
        const raw = { ...one.good, [field]: value };
        const long = longCheck(one, raw);
        const settled = one.quick(raw);
        if (settled === null) {
          if (!long.passes) refused += 1;
          continue;
        }
        passed += 1;
        expect(long.passes, `${field}: ${JSON.stringify(value)}`).toBe(true);
        expect(plain(settled)).toEqual(plain(long.input));
      }
    }
    expect(passed).toBeGreaterThan(3);
    expect(refused).toBeGreaterThan(20);
  });
});

describe('an input that is checked', () => {
  it('is trimmed and refused by the long check where the quick one does not settle it', () => {
    const quick = quickCheck(MovementInputDto);
    const raw = { number: ' KW-1 ', kind: 'counted', quantity: 3, place: ' Rack A 1 ' };
    expect(checkedInput(MovementInputDto, quick, raw)).toMatchObject({ number: 'KW-1', place: 'Rack A 1' });
    expect(() => checkedInput(MovementInputDto, quick, { ...raw, quantity: 1e12 })).toThrow(
      'quantity must be',
    );
  });
});
