import { describe, expect, it } from 'vitest';
import {
  type AddedLine,
  buildBom,
  buildEditedBom,
  type ChosenPart,
  type KitEdits,
  type PartRef,
  type SubstituteSizes,
} from './index.js';
import { libraryOf, newPartRef, twoStageKit } from './testing/kit-builder.js';

const own = newPartRef({
  number: 'KW-00101',
  kind: 'bearing',
  description: 'Bearing 12 × 28 × 8',
  mass: 0.02,
});
const library = libraryOf({ bearing: ({ bore }) => (bore === 12 ? own : null) });

function chosen(
  over: Partial<PartRef> = {},
  sizes: Partial<SubstituteSizes & { kind: 'bearing' }> = {},
): ChosenPart {
  const ref = newPartRef({
    number: 'KW-00102',
    kind: 'bearing',
    description: 'Bearing 12 × 32 × 10',
    mass: 0.04,
    ...over,
  });
  const open = { dynamicLoadRating: null, staticLoadRating: null };
  const body = {
    kind: 'bearing' as const,
    bore: 12,
    outerDiameter: 32,
    width: 10,
    type: 'deep groove ball',
    ...open,
  };
  const { number, standing = 'cleared', material } = ref;
  return { ref, fit: { number, standing, material, sizes: { ...body, ...sizes } } };
}

function added(over: Partial<AddedLine> = {}): AddedLine {
  const line = {
    partNumber: null,
    part: null,
    description: 'Name plate',
    quantity: 1,
    unit: 'pcs' as const,
    note: '',
  };
  return { id: 'a1', ...line, ...over };
}

const build = (edits: Partial<KitEdits>, kit = twoStageKit()) =>
  buildEditedBom(kit, library, { chosen: new Map(), added: [], ...edits });

describe('buildEditedBom', () => {
  it('is the kit alone where nobody changed anything', () => {
    expect(build({})).toEqual({ lines: buildBom(twoStageKit(), library), idleKeys: [] });
  });

  it('puts a chosen part on its line, which keeps its key, number and quantity and says what it replaces', () => {
    const { lines, idleKeys } = build({ chosen: new Map([['KW-00101', chosen()]]) });
    const before = buildBom(twoStageKit(), library).find(({ key }) => key === 'KW-00101');
    expect(idleKeys).toEqual([]);
    expect(lines.find(({ key }) => key === 'KW-00101')).toMatchObject({
      findNumber: before?.findNumber,
      quantity: before?.quantity,
      partNumber: 'KW-00102',
      mass: 0.04,
      note: 'Chosen in place of the kit’s own KW-00101, Bearing 12 × 28 × 8.',
      replaces: { partNumber: 'KW-00101', description: 'Bearing 12 × 28 × 8' },
    });
    expect(lines.map(({ partNumber }) => partNumber)).not.toContain('KW-00101');
  });

  it('puts a chosen part where the library has none of its own', () => {
    const key = 'bearing: Bearing, bore 20 mm';
    const { lines } = build({ chosen: new Map([[key, chosen({}, { bore: 20 })]]) });
    const line = lines.find((one) => one.key === key);
    expect(line).toMatchObject({ partNumber: 'KW-00102', replaces: { partNumber: null } });
    expect(line?.flags).not.toContain('not in the library');
  });

  it('flags a chosen part that was withdrawn, and one that no longer fits, and never drops it', () => {
    const withdrawn = build({ chosen: new Map([['KW-00101', chosen({ standing: 'withdrawn' })]]) });
    const line = withdrawn.lines.find(({ key }) => key === 'KW-00101');
    expect(line?.partNumber).toBe('KW-00102');
    expect(line?.flags).toContain('part is withdrawn');
    expect(line?.flags.filter((flag) => flag.startsWith('does not fit'))).toEqual([]);
    const loose = build({ chosen: new Map([['KW-00101', chosen({}, { bore: 15 })]]) });
    expect(loose.lines.find(({ key }) => key === 'KW-00101')?.flags).toContain(
      'does not fit its place: bore 15 mm, not 12 mm',
    );
  });

  it('does not merge a chosen part with the kit’s own line of the same part', () => {
    const key = 'bearing: Bearing, bore 15 mm';
    const { lines } = build({ chosen: new Map([[key, { ...chosen(), ref: own }]]) });
    const same = lines.filter(({ partNumber }) => partNumber === 'KW-00101');
    expect(same.map((line) => [line.key, line.quantity])).toEqual([
      ['KW-00101', 2],
      [key, 2],
    ]);
  });

  it('names the choices whose line the kit no longer has', () => {
    expect(build({ chosen: new Map([['KW-00555', chosen()]]) }).idleKeys).toEqual(['KW-00555']);
  });

  it('keeps the choice of the same line when the rest of the kit changes', () => {
    const wider = twoStageKit({ box: { length: 300, width: 80, height: 120, wall: 6 } });
    const { lines } = build({ chosen: new Map([['KW-00101', chosen()]]) }, wider);
    expect(lines.find(({ key }) => key === 'KW-00101')?.partNumber).toBe('KW-00102');
  });
});

describe('added lines', () => {
  it('follow the kit’s lines of their kind, numbered on, and are never merged with them', () => {
    const kit = buildBom(twoStageKit(), library).filter(({ kind }) => kind === 'bearing');
    const last = Math.max(...kit.map(({ findNumber }) => findNumber));
    const { lines } = build({
      added: [added({ partNumber: 'KW-00101', part: own, description: '', quantity: 3 })],
    });
    expect(lines.filter(({ kind }) => kind === 'bearing').at(-1)).toMatchObject({
      findNumber: last + 1,
      partNumber: 'KW-00101',
      description: 'Bearing 12 × 28 × 8',
      quantity: 3,
      extraLineId: 'a1',
      source: ['Added line'],
      flags: [],
    });
  });

  it('stand after everything else where they have no number, flagged', () => {
    const { lines } = build({ added: [added({ note: 'engraved' }), added({ id: 'a2' })] });
    expect(lines.slice(-2)).toMatchObject([
      {
        findNumber: 1101,
        kind: 'other',
        description: 'Name plate',
        note: 'engraved',
        flags: ['not in the library'],
      },
      { findNumber: 1102 },
    ]);
  });

  it('number fasteners in their own block, and flag a withdrawn one', () => {
    const screw = newPartRef({ number: 'KW-00301', kind: 'fastener', standing: 'withdrawn' });
    const { lines } = build({ added: [added({ partNumber: 'KW-00301', part: screw, quantity: 8 })] });
    const line = lines.find(({ kind }) => kind === 'fastener');
    expect(line).toMatchObject({ findNumber: 1001, flags: ['part is withdrawn'] });
    // What was typed is kept beside the library's description.
    expect(line?.note).toBe('Name plate');
  });

  it('never share a find number, however many there are', () => {
    const screw = newPartRef({ number: 'KW-00301', kind: 'fastener' });
    const ids = Array.from({ length: 250 }, (_, index) => `s${index}`);
    const screws = ids.map((id) => added({ id, partNumber: 'KW-00301', part: screw }));
    const { lines } = build({ added: [...screws, added({ id: 'plate' })] });
    const numbers = lines.map(({ findNumber }) => findNumber);
    expect(new Set(numbers).size).toBe(lines.length);
    // Block 10 holds 1001 to 1099; the hundredth screw begins above all blocks.
    expect(
      lines
        .filter(({ kind }) => kind === 'fastener')
        .map(({ findNumber }) => findNumber)
        .slice(97, 101),
    ).toEqual([1098, 1099, 100_100, 100_101]);
    expect(lines.at(-1)?.findNumber).toBe(1101);
  });

  it('weigh a lubricant by the litre: a pack of 5 l at 4.5 kg is 0.9 kg a litre', () => {
    const oil = newPartRef({ number: 'KW-00401', kind: 'lubricant', mass: 4.5, packVolume: 5 });
    const { lines } = build({
      added: [added({ partNumber: 'KW-00401', part: oil, quantity: 0.5, unit: 'l' })],
    });
    expect(lines.find(({ partNumber }) => partNumber === 'KW-00401')).toMatchObject({
      mass: 0.9,
      quantity: 0.5,
    });
  });
});
