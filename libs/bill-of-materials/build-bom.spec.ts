import { describe, expect, it } from 'vitest';
import { bomTotals, buildBom, FLAG, partNumberText, type BomLine, type PartGear } from './index.js';
import { emptyLibrary, libraryOf, newPartRef, twoStageKit } from './testing/kit-builder.js';

const ofKind = (lines: BomLine[], kind: BomLine['kind']) => lines.filter((line) => line.kind === kind);

function only(lines: BomLine[], kind: BomLine['kind']): BomLine {
  const [line, ...more] = ofKind(lines, kind);
  if (!line || more.length > 0)
    throw new Error(`expected one line of ${kind}, got ${more.length + (line ? 1 : 0)}`);
  return line;
}

describe('the kit of a two-stage train, counted by hand', () => {
  const lines = buildBom(twoStageKit(), emptyLibrary);
  const shown = (kind: BomLine['kind']) =>
    ofKind(lines, kind).map((line) => `${line.findNumber} ${line.description} ${line.quantity}`);

  it('lists four gears and three shafts in stage order', () => {
    expect(shown('gear')).toEqual([
      '101 Spur gear z 20, m 1.5, 20°, x 0, face 15 mm, bore 12 mm 1',
      '102 Spur gear z 60, m 1.5, 20°, x 0, face 15 mm, bore 15 mm 1',
      '103 Spur gear z 20, m 2, 20°, x 0, face 20 mm, bore 15 mm 1',
      '104 Spur gear z 50, m 2, 20°, x 0, face 20 mm, bore 20 mm 1',
    ]);
    expect(shown('shaft')).toEqual([
      '301 Shaft Ø12 × 60 mm 1',
      '302 Shaft Ø15 × 60 mm 1',
      '303 Shaft Ø20 × 60 mm 1',
    ]);
    expect(shown('pinion-shaft')).toEqual([]);
  });

  it('gives each shaft two bearings, each keyed gear a key by its bore and a ring, each shaft one ring more', () => {
    expect(shown('bearing')).toEqual([
      '401 Bearing, bore 12 mm 2',
      '402 Bearing, bore 15 mm 2',
      '403 Bearing, bore 20 mm 2',
    ]);
    // DIN 6885-1: bore 12 → 4 × 4, 15 → 5 × 5, 20 → 6 × 6; longest standard length within the face width.
    expect(shown('key')).toEqual([
      '501 Parallel key DIN 6885-1 A 4 × 4 × 14 1',
      '502 Parallel key DIN 6885-1 A 5 × 5 × 14 1',
      '503 Parallel key DIN 6885-1 A 5 × 5 × 20 1',
      '504 Parallel key DIN 6885-1 A 6 × 6 × 20 1',
    ]);
    expect(shown('retaining-ring')).toEqual([
      '601 Retaining ring DIN 471 12 × 1 2',
      '602 Retaining ring DIN 471 15 × 1 3',
      '603 Retaining ring DIN 471 20 × 1.2 2',
    ]);
  });

  it('closes with seals at input and output, housing and oil', () => {
    expect(shown('seal')).toEqual([
      '701 Rotary shaft seal, shaft Ø12 mm 1',
      '702 Rotary shaft seal, shaft Ø20 mm 1',
    ]);
    expect(shown('housing')).toEqual(['801 Housing 200 × 80 × 120 mm, wall 6 mm 1']);
    // Inside 188 × 68 × 108 mm = 1.381 l; a third is 0.460 l, rounded up to 0.5 l.
    expect(shown('lubricant')).toEqual(['901 Gear oil ISO VG 220 0.5']);
    expect(lines).toHaveLength(4 + 3 + 3 + 4 + 3 + 2 + 1 + 1);
  });

  it('joins the sources of equal parts', () => {
    const ring = ofKind(lines, 'retaining-ring')[1];
    expect(ring?.source).toEqual(['Stage 1 wheel', 'Stage 2 pinion', 'Shaft 1, locating bearing']);
  });

  it('weighs discs with bores, shafts and the closed box', () => {
    // π/4 (90² − 15²) · 15 mm³ of steel at 7,850 kg/m³ = 0.7283 kg; π/4 · 12² · 60 mm³ = 0.05327 kg.
    expect(ofKind(lines, 'gear')[1]?.mass).toBeCloseTo(0.7283, 4);
    expect(ofKind(lines, 'shaft')[0]?.mass).toBeCloseTo(0.05327, 5);
    // (200 · 80 · 120 − 188 · 68 · 108) mm³ of aluminium at 2,700 kg/m³ = 1.4562 kg.
    expect(only(lines, 'housing').mass).toBeCloseTo(1.4562, 4);
  });

  it('flags what is not in the library and every bearing, and drops nothing', () => {
    expect(lines.every((line) => line.flags.includes(FLAG.notInLibrary))).toBe(true);
    expect(ofKind(lines, 'bearing').every((line) => line.flags.includes('size not checked'))).toBe(true);
    expect(lines.map(partNumberText)).toEqual(
      lines.map((line) => (['gear', 'shaft', 'housing'].includes(line.kind) ? 'to be made' : 'to be chosen')),
    );
  });

  it('totals lines, makes and masses', () => {
    const totals = bomTotals(lines);
    expect(totals).toMatchObject({ lines: 21, made: 8, bought: 13 });
    // Without a library the masses of bearings (3 lines), rings (3), seals (2) and oil (1) are not known.
    expect(totals.linesWithoutMass).toBe(9);
  });
});

describe('a pinion too thin for a keyway', () => {
  // z 12, m 1.5 on a 12 mm shaft: d_f = 18 − 3.75 = 14.25 mm; the rim (14.25 − 12)/2 − 1.8 is below 2 · 1.5 mm.
  const kit = twoStageKit();
  const gears = kit.gears.map((gear, i) => (i === 0 ? { ...gear, teeth: 12 } : gear));
  const lines = buildBom({ ...kit, gears }, emptyLibrary);

  it('is cut on its shaft: one part for both, no key and no ring for it', () => {
    const pinionShaft = only(lines, 'pinion-shaft');
    expect(pinionShaft.findNumber).toBe(201);
    expect(pinionShaft.source).toEqual(['Stage 1 pinion, shaft 0']);
    expect(ofKind(lines, 'gear')).toHaveLength(3);
    expect(ofKind(lines, 'shaft').map((line) => line.source)).toEqual([['Shaft 1'], ['Shaft 2']]);
    expect(ofKind(lines, 'key')).toHaveLength(3);
    const rings = ofKind(lines, 'retaining-ring').map((line) => [line.description, line.quantity]);
    expect(rings).toContainEqual(['Retaining ring DIN 471 12 × 1', 1]);
    // Shaft π/4 · 12² · 60 and what stands above it, π/4 (18² − 12²) · 15 mm³, at 7,850 kg/m³: 0.06992 kg.
    expect(pinionShaft.mass).toBeCloseTo(0.06992, 4);
  });

  it('stands on the rim exactly at the limit', () => {
    // Bore 20: t2 = 2.8, two modules = 4; d_f = 20 + 2 (4 + 2.8) = 33.6 keeps the key, a hair less does not.
    const at = (rootDiameter: number) => {
      const figures = { rootDiameter };
      const withRoot = kit.gears.map((gear, i) => (i === 2 ? { ...gear, figures } : gear));
      const shafts = kit.shafts.map((shaft) => (shaft.index === 1 ? { ...shaft, diameter: 20 } : shaft));
      return ofKind(buildBom({ ...kit, gears: withRoot, shafts }, emptyLibrary), 'pinion-shaft').length;
    };
    expect(at(33.6 + 1e-9)).toBe(0);
    expect(at(33.599)).toBe(1);
  });

  it('may be keyed all the same when the designer says so, flagged', () => {
    const keyed = gears.map((gear, i) => (i === 0 ? { ...gear, mounting: 'keyed' as const } : gear));
    const pinion = ofKind(buildBom({ ...kit, gears: keyed }, emptyLibrary), 'gear')[0];
    expect(pinion?.flags).toContain(FLAG.thinRim);
  });
});

describe('parts from the library', () => {
  const stockGear = {
    teeth: 20,
    module: 1.5,
    pressureAngleDeg: 20,
    helixAngleDeg: 0,
    hand: null,
    profileShift: 0,
    faceWidth: 15,
    bore: 12,
    thicknessAllowance: { upper: -0.05, lower: -0.1 },
  };
  const gearLibrary = (gear: Partial<PartGear>) =>
    libraryOf({
      gear: (need) =>
        need.teeth === 20 && need.module === 1.5
          ? newPartRef({ number: 'KW-00417', kind: 'gear', gear: { ...stockGear, ...gear } })
          : null,
    });
  const pinionOf = (lines: BomLine[]) => lines.find((line) => line.partNumber === 'KW-00417');

  it('stands on the line with its number, maker and mass, unflagged and without gear data', () => {
    const pinion = pinionOf(buildBom(twoStageKit(), gearLibrary({})));
    expect(pinion).toMatchObject({ supplier: 'Harrow Point Gears', mass: 0.25, supply: 'bought', flags: [] });
    expect(pinion).not.toHaveProperty('gearData');
  });

  it('counts an unknown shift or allowance as none, flagged', () => {
    const pinion = pinionOf(
      buildBom(twoStageKit(), gearLibrary({ profileShift: null, thicknessAllowance: null })),
    );
    expect(pinion?.flags).toEqual([FLAG.shiftUnknown, FLAG.allowanceUnknown]);
    expect(FLAG.shiftUnknown).toContain('x = 0');
  });

  it('says so when the design counts with another shift than the stock gear has', () => {
    const kit = twoStageKit();
    const gears = kit.gears.map((gear, i) => (i === 0 ? { ...gear, profileShift: 0.3 } : gear));
    const pinion = pinionOf(
      buildBom({ ...kit, gears }, gearLibrary({ profileShift: null, thicknessAllowance: null })),
    );
    expect(pinion?.flags).toContain('shift x 0 in stock, 0.3 in the design');
  });

  it('names every other figure in which a chosen gear differs from the design', () => {
    const kit = twoStageKit();
    const chosen = {
      ...stockGear,
      teeth: 21,
      module: 2,
      faceWidth: 12,
      helixAngleDeg: 15,
      hand: 'left' as const,
    };
    const gears = kit.gears.map((gear, i) =>
      i === 0 ? { ...gear, helixAngleDeg: 20, hand: 'right' as const } : gear,
    );
    const library = libraryOf({
      gear: (need) =>
        need.helixAngleDeg === 20 ? newPartRef({ number: 'KW-00417', kind: 'gear', gear: chosen }) : null,
    });
    expect(pinionOf(buildBom({ ...kit, gears }, library))?.flags).toEqual(
      expect.arrayContaining([
        'teeth 21 in stock, 20 in the design',
        'module 2 in stock, 1.5 in the design',
        'helix angle 15 in stock, 20 in the design',
        'face width 12 in stock, 15 in the design',
        'left hand in stock, right in the design',
      ]),
    );
  });

  it('does not mind a stock gear that is wider', () => {
    expect(pinionOf(buildBom(twoStageKit(), gearLibrary({ faceWidth: 20 })))?.flags).toEqual([]);
  });

  it('lets the key fill the hub of a stock gear', () => {
    const lines = buildBom(twoStageKit(), gearLibrary({ hubLength: 26 }));
    const key = ofKind(lines, 'key').find((line) => line.source.includes('Stage 1 pinion'));
    expect(key?.description).toBe('Parallel key DIN 6885-1 A 4 × 4 × 25');
  });

  it('computes the mass that the library does not know', () => {
    const library = libraryOf({ gear: () => newPartRef({ number: 'KW-00001', kind: 'gear', mass: null }) });
    // π/4 (30² − 12²) · 15 mm³ of steel at 7,850 kg/m³ = 0.06992 kg.
    expect(ofKind(buildBom(twoStageKit(), library), 'gear')[0]?.mass).toBeCloseTo(0.069915, 6);
  });

  it.each([
    [10, 'bore 10 mm, bore out to 12 mm'],
    [15, 'bore 15 mm, shaft 12 mm: step the seat up'],
  ])('says what to do about a bore of %d mm', (bore, flag) => {
    const lines = buildBom(twoStageKit(), gearLibrary({ bore }));
    expect(pinionOf(lines)?.flags).toContain(flag);
    const key = ofKind(lines, 'key').find((line) => line.source.includes('Stage 1 pinion'));
    expect(key?.description).toContain(bore === 15 ? '5 × 5' : '4 × 4');
  });

  it('keeps a chosen number that the library does not hold, flagged', () => {
    const kit = twoStageKit();
    const gears = kit.gears.map((gear, i) => (i === 0 ? { ...gear, partNumber: 'KW-09999' } : gear));
    const pinion = ofKind(buildBom({ ...kit, gears }, emptyLibrary), 'gear')[0];
    expect(pinion).toMatchObject({ partNumber: 'KW-09999', source: ['Stage 1 pinion'] });
    expect(pinion?.flags).toContain(FLAG.notInLibrary);
  });

  it.each([
    ['draft', FLAG.draftPart],
    ['withdrawn', FLAG.withdrawnPart],
  ] as const)('flags a %s part', (standing, flag) => {
    const library = libraryOf({
      bearing: () => newPartRef({ number: 'KW-00501', kind: 'bearing', standing }),
    });
    expect(ofKind(buildBom(twoStageKit(), library), 'bearing')[0]?.flags).toContain(flag);
  });

  it('asks for bearings, keys, rings, seals by size and rolls one number up over the whole train', () => {
    const asked: string[] = [];
    const library = libraryOf({
      bearing: (need) => newPartRef({ number: `B${need.bore}`, kind: 'bearing', mass: 0.04 }),
      key: (need) => {
        asked.push(`${need.width}×${need.height}×${need.length}`);
        return newPartRef({ number: 'KEY', kind: 'key', mass: 0.002 });
      },
      'retaining-ring': (need) => newPartRef({ number: `R${need.shaftDiameter}`, kind: 'retaining-ring' }),
      seal: (need) => newPartRef({ number: `S${need.shaftDiameter}`, kind: 'seal' }),
      lubricant: () => newPartRef({ number: 'OIL', kind: 'lubricant', mass: 4.5, packVolume: 5 }),
    });
    const lines = buildBom(twoStageKit(), library);
    expect(ofKind(lines, 'bearing').map((line) => line.partNumber)).toEqual(['B12', 'B15', 'B20']);
    expect(asked).toEqual(['4×4×14', '5×5×14', '5×5×20', '6×6×20']);
    expect(only(lines, 'key')).toMatchObject({ quantity: 4, partNumber: 'KEY' });
    expect(ofKind(lines, 'seal').map((line) => line.partNumber)).toEqual(['S12', 'S20']);
    // A pack of 5 l weighs 4.5 kg, so a litre weighs 0.9 kg.
    expect(only(lines, 'lubricant')).toMatchObject({ unit: 'l', quantity: 0.5, mass: 0.9 });
  });

  it('cuts a longer stock shaft down and flags a shorter one', () => {
    const library = (length: number) =>
      libraryOf({ shaft: () => newPartRef({ number: 'KW-00600', kind: 'shaft', length }) });
    expect(only(buildBom(twoStageKit(), library(500)), 'shaft')).toMatchObject({
      note: 'Cut from stock: 60 mm between bearing faces, and seats and shaft ends as drawn.',
      flags: [],
    });
    // A stock shaft as long as the span leaves nothing for the bearings to sit on.
    for (const length of [50, 60])
      expect(only(buildBom(twoStageKit(), library(length)), 'shaft').flags).toHaveLength(1);
    expect(only(buildBom(twoStageKit(), library(50)), 'shaft').flags).toEqual([
      '50 mm long in stock, more than 60 mm needed',
    ]);
  });
});
