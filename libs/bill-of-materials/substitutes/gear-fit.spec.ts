import { describe, expect, it } from 'vitest';
import { fitAsSubstitute } from './fit-as-substitute.js';
import { type FitPlace, type SubstituteGear, type SubstitutePart } from './substitute-part.js';

const C45 = { contact: 360, bending: 146 };
const CASE_HARDENED = { contact: 1500, bending: 425 };

/** m 2, z 40: d = 80, d_f = 80 − 2·2·1.25 = 75 mm. */
function gear(
  number: string,
  sizes: Partial<SubstituteGear> = {},
  part: Partial<SubstitutePart> = {},
): SubstitutePart {
  const teeth = { teeth: 40, module: 2, pressureAngleDeg: 20, helixAngleDeg: 0, hand: null, profileShift: 0 };
  const body = { faceWidth: 20, bore: 20, hubDiameter: null, hubLength: null };
  const made = { heatTreatment: null, hardened: false, strength: C45, softerThanSteel: false };
  return {
    number,
    standing: 'cleared',
    material: 'C45',
    ...part,
    sizes: { kind: 'gear', ...teeth, ...body, ...made, ...sizes },
  };
}

const fit = (sizes: Partial<SubstituteGear>, part: Partial<SubstitutePart> = {}, place?: FitPlace) =>
  fitAsSubstitute(gear('OLD'), gear('NEW', sizes, part), place);
const fitFor = (original: Partial<SubstituteGear>, sizes: Partial<SubstituteGear>, place?: FitPlace) =>
  fitAsSubstitute(gear('OLD', original), gear('NEW', sizes), place);

describe('a gear in place of a gear', () => {
  it('fits when everything is the same', () => {
    expect(fit({})).toEqual({ fits: true, misfits: [], differences: [], toCheck: [] });
  });

  it.each<[Partial<SubstituteGear>, string]>([
    [{ teeth: 41 }, 'teeth 41, not 40'],
    [{ module: 2.5 }, 'module 2.5 mm, not 2 mm'],
    [{ pressureAngleDeg: 14.5 }, 'pressure angle 14.5°, not 20°'],
    [{ helixAngleDeg: 15, hand: 'left' }, 'helix angle 15°, not 0°'],
    [{ profileShift: 0.2 }, 'profile shift 0.2, not 0'],
    [{ bore: 25 }, 'bore 25 mm, larger than 20 mm'],
    [{ faceWidth: 18 }, 'face width 18 mm, less than 20 mm'],
  ])('does not fit with %o', (sizes, reason) => {
    const { fits, misfits } = fit(sizes);
    expect(fits).toBe(false);
    expect(misfits).toContain(reason);
  });

  it('needs the same hand of a helix, and asks where it is not stated', () => {
    const left: Partial<SubstituteGear> = { helixAngleDeg: 15, hand: 'left' };
    expect(fitFor(left, left).fits).toBe(true);
    expect(fitFor(left, { ...left, hand: 'right' }).misfits).toEqual(['hand right, not left']);
    expect(fitFor(left, { ...left, hand: null })).toMatchObject({
      fits: true,
      toCheck: ['hand is not stated; left is needed'],
    });
  });

  it('counts a shift that is not stated as 0, and wants it checked', () => {
    expect(fitFor({ profileShift: 0 }, { profileShift: null })).toMatchObject({
      fits: true,
      toCheck: ['profile shift is not stated, counted as 0'],
    });
    expect(fitFor({ profileShift: null }, { profileShift: 0 }).toCheck).toHaveLength(1);
    expect(fitFor({ profileShift: null }, { profileShift: null }).toCheck).toHaveLength(1);
    expect(fitFor({ profileShift: 0.3 }, { profileShift: null }).fits).toBe(false);
  });

  it('says how much wider it is, and counts what the place needs and has room for', () => {
    expect(fit({ faceWidth: 25 }).differences).toEqual(['face width 25 mm, 5 mm more']);
    expect(fit({ faceWidth: 18 }, {}, { leastFaceWidth: 15 })).toMatchObject({
      fits: true,
      differences: ['face width 18 mm, 3 mm more'],
    });
    const room = { leastFaceWidth: 20, mostFaceWidth: 24 };
    expect(fit({ faceWidth: 24 }, {}, room).fits).toBe(true);
    expect(fit({ faceWidth: 25 }, {}, room).misfits).toEqual(['face width 25 mm; there is room for 24 mm']);
  });
});

describe('a smaller bore', () => {
  it('is bored out, and that is said', () => {
    // Rim at 20 mm: (75 − 20)/2 − 2.8 = 24.7 mm, far above 2·2 mm.
    expect(fit({ bore: 15 })).toMatchObject({
      fits: true,
      differences: ['bore 15 mm, to be bored out to 20 mm'],
    });
  });

  it('must leave two modules of rim under the keyway (DIN 6885-1: t2 = 2.8 mm for 20 and 22 mm)', () => {
    // z 20: d = 40, d_f = 35. At 20 mm (35 − 20)/2 − 2.8 = 4.7 ≥ 4 mm; at 22 mm (35 − 22)/2 − 2.8 = 3.7 < 4 mm.
    expect(fitFor({ teeth: 20, bore: 20 }, { teeth: 20, bore: 12 }).fits).toBe(true);
    expect(fitFor({ teeth: 20, bore: 22 }, { teeth: 20, bore: 12 }).misfits).toEqual([
      'bore 12 mm, to be bored out to 22 mm: 3.7 mm of rim under the keyway would be left, at least 4 mm is needed',
    ]);
  });

  it('counts with the root diameter that the caller worked out', () => {
    // (33.5 − 20)/2 − 2.8 = 3.95 < 4 mm.
    expect(fitFor({ teeth: 20, bore: 20 }, { teeth: 20, bore: 12, rootDiameter: 33.5 }).fits).toBe(false);
  });

  it('must stay inside the hub', () => {
    expect(fit({ bore: 15, hubDiameter: 20 }).misfits).toEqual([
      'bore 15 mm, to be bored out to 20 mm: its hub is 20 mm across',
    ]);
    expect(fit({ bore: 15, hubDiameter: 30 }).fits).toBe(true);
  });

  it('is held against the shaft of the place rather than the bore of the original', () => {
    expect(fit({ bore: 18 }, {}, { shaftDiameter: 18 })).toMatchObject({ fits: true, differences: [] });
    expect(fit({ bore: 20 }, {}, { shaftDiameter: 18 }).fits).toBe(false);
  });

  it('is to be checked where the gear is hardened, and where the key gets less length', () => {
    expect(fit({ bore: 15, hardened: true }).toCheck).toEqual([
      'hardened: ask whether the bore can still be machined',
    ]);
    expect(fitFor({ hubLength: 30 }, {}).toCheck).toEqual([
      'the bore is 20 mm long, 10 mm shorter: see that the key fits',
    ]);
  });
});

describe('its material', () => {
  it('may be stronger, which is said', () => {
    const { fits, differences } = fit(
      { strength: CASE_HARDENED, heatTreatment: 'case-hardened' },
      { material: '16MnCr5' },
    );
    expect(fits).toBe(true);
    expect(differences).toEqual([
      'stronger material, 16MnCr5, case-hardened: σ_Hlim 1500 for 360, σ_Flim 425 for 146 N/mm² (typical, confirm with the supplier)',
    ]);
  });

  it.each<[string, { contact: number; bending: number }, number]>([
    ['in both', { contact: 300, bending: 120 }, 2],
    ['in bending alone, although stronger in contact', { contact: 1200, bending: 100 }, 1],
    ['in contact alone', { contact: 359, bending: 500 }, 1],
  ])('must not be weaker %s', (_, strength, reasons) => {
    const { fits, misfits } = fit({ strength }, { material: 'other' });
    expect(fits).toBe(false);
    expect(misfits).toHaveLength(reasons);
  });

  it('drops in unrated only as the very same; any other is to be checked', () => {
    const plastic = (number: string, material: string | null, heatTreatment: string | null = null) =>
      gear(number, { strength: null, heatTreatment }, { material });
    const check = (a: string | null, b: string | null) => fitAsSubstitute(plastic('A', a), plastic('B', b));
    expect(check('POM', 'pom')).toMatchObject({ fits: true, toCheck: [] });
    expect(check('POM', 'PA 6').toCheck).toEqual(['material PA 6 in place of POM: strength is not rated']);
    expect(check('POM', null).toCheck).toHaveLength(1);
    expect(check(null, 'POM').toCheck).toEqual(['material POM: the original’s is not known']);
    expect(check(null, null).toCheck).toHaveLength(1);
    // C45 so soft that the table does not rate it, in place of rated C45.
    expect(fit({ strength: null }).toCheck).toEqual(['material C45 in place of C45: strength is not rated']);
    // Stainless steel: not rated, and not known to be weaker either.
    expect(fit({ strength: null }, { material: '1.4301' })).toMatchObject({
      fits: true,
      toCheck: ['material 1.4301 in place of C45: strength is not rated'],
    });
    // Acetal in place of steel is no matter of checking.
    expect(fit({ strength: null, softerThanSteel: true }, { material: 'POM' })).toMatchObject({
      fits: false,
      misfits: ['material POM is weaker than C45'],
    });
  });
});

describe('whatever its sizes', () => {
  it.each(['draft', 'withdrawn'] as const)('a %s part never fits', (standing) => {
    expect(fit({}, { standing }).misfits).toEqual([`it is ${standing}`]);
  });

  it('a part is no substitute for itself, whatever the case of its number', () => {
    expect(fitAsSubstitute(gear('KW-1'), gear('kw-1')).misfits).toEqual(['it is the same part']);
  });

  it('fits in place of a withdrawn original', () => {
    expect(fitAsSubstitute(gear('OLD', {}, { standing: 'withdrawn' }), gear('NEW')).fits).toBe(true);
  });
});
