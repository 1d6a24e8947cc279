import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type KitItem } from './bom-line.js';
import { BOM_KINDS, buildBom, type BomLine, type KitRequest, type PartFinder } from './index.js';
import { rollUp } from './roll-up.js';
import { newKitGear, newPartRef } from './testing/kit-builder.js';

const quantityOf = (lines: readonly KitItem[], ...kinds: KitItem['kind'][]) =>
  lines.filter((line) => kinds.includes(line.kind)).reduce((sum, line) => sum + line.quantity, 0);
const massOf = (lines: readonly KitItem[]) =>
  lines.reduce((sum, line) => sum + line.quantity * (line.mass ?? 0), 0);

// Few choices for each field, so that equal and nearly equal parts are common.
const item: fc.Arbitrary<KitItem> = fc.record({
  kind: fc.constantFrom('key' as const, 'seal' as const),
  partNumber: fc.constantFrom(null, 'KW-00001'),
  description: fc.constant('one'),
  quantity: fc.integer({ min: 1, max: 9 }),
  unit: fc.constant('pcs' as const),
  material: fc.constantFrom(null, 'steel'),
  supply: fc.constantFrom('made' as const, 'bought' as const),
  supplier: fc.constant(null),
  mass: fc.constantFrom(null, 0.1, 2.5),
  source: fc.array(fc.string({ minLength: 1, maxLength: 3 }), { minLength: 1, maxLength: 2 }),
  note: fc.constantFrom('', 'Cut to length.', 'Deburr.'),
  flags: fc.subarray(['size not checked', 'not in the library', 'mass estimated']),
});

describe('rollUp', () => {
  it('keeps every quantity, mass, source, note and flag', () => {
    fc.assert(
      fc.property(fc.array(item, { maxLength: 60 }), (items) => {
        const lines = rollUp(items);
        expect(massOf(lines)).toBeCloseTo(massOf(items), 9);
        for (const kind of BOM_KINDS) expect(quantityOf(lines, kind)).toBe(quantityOf(items, kind));
        for (const one of items) {
          const home = lines.find((line) => carries(line, one));
          expect(home).toBeDefined();
        }
      }),
    );
  });

  it('leaves no two equal lines, numbers upward within the block of the kind, and changes nothing when repeated', () => {
    fc.assert(
      fc.property(fc.array(item, { maxLength: 60 }), (items) => {
        const lines = rollUp(items);
        const numbers = lines.map((line) => line.findNumber);
        expect(numbers).toEqual([...new Set(numbers)].sort((a, b) => a - b));
        for (const line of lines) {
          expect(Math.floor(line.findNumber / 100) - 1).toBe(BOM_KINDS.indexOf(line.kind));
        }
        expect(rollUp(lines)).toEqual(lines);
      }),
    );
  });

  it('gives every line a key: its part number, else kind and description, with a count where those meet', () => {
    const one = (changes: Partial<KitItem>): KitItem => ({
      kind: 'key',
      partNumber: null,
      description: 'Parallel key 6 × 6 × 20',
      quantity: 1,
      unit: 'pcs',
      material: null,
      supply: 'bought',
      supplier: null,
      mass: null,
      source: ['Shaft 1'],
      note: '',
      flags: [],
      ...changes,
    });
    const lines = rollUp([
      one({}),
      one({ partNumber: 'KW-00007' }),
      one({ material: 'steel' }),
      one({}),
      one({ partNumber: 'KW-00009', key: 'KW-00008' }),
    ]);
    expect(lines.map(({ key, quantity }) => [key, quantity])).toEqual([
      ['key: Parallel key 6 × 6 × 20', 2],
      ['KW-00007', 1],
      ['key: Parallel key 6 × 6 × 20 (2)', 1],
      ['KW-00008', 1],
    ]);
    // Nothing but the item's own words decides: the same kit in another build has the same keys.
    expect(rollUp([one({ quantity: 5 })])[0]?.key).toBe(lines[0]?.key);
  });

  it('numbers one kind whatever stands in another', () => {
    fc.assert(
      fc.property(fc.array(item, { maxLength: 30 }), fc.array(item, { maxLength: 30 }), (items, others) => {
        const keys = items.filter((one) => one.kind === 'key');
        const alone = rollUp(keys);
        // A part number belongs to one kind.
        const seals = others
          .filter((one) => one.kind === 'seal')
          .map((one) => ({ ...one, partNumber: one.partNumber && 'KW-00002' }));
        const among = rollUp([...seals, ...keys]);
        expect(among.filter((line) => line.kind === 'key')).toEqual(alone);
      }),
    );
  });
});

function carries(line: BomLine, one: KitItem): boolean {
  const same = (['kind', 'partNumber', 'description', 'unit', 'supply', 'mass', 'material'] as const).every(
    (field) => line[field] === one[field],
  );
  return (
    same &&
    one.source.every((source) => line.source.includes(source)) &&
    one.flags.every((flag) => line.flags.includes(flag)) &&
    line.note.includes(one.note)
  );
}

const train: fc.Arbitrary<KitRequest> = fc
  .record({
    teeth: fc.array(fc.tuple(fc.integer({ min: 8, max: 40 }), fc.integer({ min: 20, max: 120 })), {
      minLength: 1,
      maxLength: 4,
    }),
    diameters: fc.array(fc.integer({ min: 3, max: 90 }), { minLength: 5, maxLength: 5 }),
    module: fc.constantFrom(0.5, 1, 1.5, 2, 3),
    helixAngleDeg: fc.constantFrom(0, 15),
  })
  .map(({ teeth, diameters, module, helixAngleDeg }) => ({
    trainTitle: 'Vent drive',
    gears: teeth.flatMap(([z1, z2], i) => [
      newKitGear({ stage: i + 1, role: 'pinion', teeth: z1, module, helixAngleDeg, hand: 'left' }),
      newKitGear({ stage: i + 1, role: 'wheel', teeth: z2, module, helixAngleDeg, hand: 'right' }),
    ]),
    shafts: diameters.slice(0, teeth.length + 1).map((diameter, index) => ({ index, diameter, length: 70 })),
    box: { length: 300, width: 120, height: 200, wall: 8 },
  }));

describe('the kit of any train', () => {
  it('holds every part the kit rules ask for, whatever the library holds', () => {
    const held = fc.subarray([...BOM_KINDS]);
    fc.assert(
      fc.property(train, held, (request, kinds) => {
        const library: PartFinder = {
          find: (need) =>
            kinds.includes(need.kind)
              ? newPartRef({ number: JSON.stringify(need), kind: need.kind, packVolume: 1 })
              : null,
        };
        const lines = buildBom(request, library);
        const shafts = request.shafts.length;
        const keyed = quantityOf(lines, 'gear');
        expect(quantityOf(lines, 'gear', 'pinion-shaft')).toBe(request.gears.length);
        expect(quantityOf(lines, 'shaft', 'pinion-shaft')).toBe(shafts);
        expect(quantityOf(lines, 'bearing')).toBe(2 * shafts);
        expect(quantityOf(lines, 'key')).toBe(keyed);
        expect(quantityOf(lines, 'retaining-ring')).toBe(keyed + shafts);
        expect(quantityOf(lines, 'seal')).toBe(2);
        expect(quantityOf(lines, 'housing')).toBe(1);
        expect(quantityOf(lines, 'lubricant')).toBeGreaterThan(0);
        for (const line of lines) {
          expect(line.flags.includes('not in the library')).toBe(line.partNumber === null);
          if (line.mass !== null) expect(line.mass).toBeGreaterThan(0);
        }
      }),
    );
  });
});
