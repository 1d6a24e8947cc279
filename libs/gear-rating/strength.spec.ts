import { describe, expect, it } from 'vitest';
import { MATERIAL_FIELDS } from './materials.js';
import { isSofterThanSteel, isSurfaceHardened, strengthOf } from './strength.js';

const rated = (
  material: string | null,
  heatTreatment: string | null = null,
  hardness: string | null = null,
) => strengthOf({ material, heatTreatment, hardness });

// Lines of ISO 6336-5, quality MQ, from memory; each row worked by hand, N/mm².
describe('strengthOf', () => {
  it.each<[string, string | null, string | null, number, number]>([
    // Normalised: 1.000·HBW + 190 and 0.455·HBW + 69.
    ['C45', null, '200 HBW', 390, 160],
    ['C45', null, null, 360, 146], // 170 HBW where nothing is stated
    ['S235JR', null, null, 310, 124], // 120 HBW
    ['16MnCr5', null, null, 330, 133], // 140 HBW
    // Through-hardened carbon steel: 0.925·HV + 360 and 0.240·HV + 163.
    ['steel C45E (1.1191)', 'quenched and tempered', '200 HV', 545, 211],
    // Through-hardened alloy steel: 1.313·HV + 373 and 0.425·HV + 187.
    ['42CrMo4', 'quenched and tempered', '280 HV', 741, 306],
    ['42CrMo4+QT', null, '280 HV', 741, 306],
    ['42CrMo4', null, null, 636, 272], // 200 HV
    ['42CrMo4', 'quenched and tempered', '500 HV', 846, 340], // the field ends at 360 HV
    // Induction-hardened: 0.541·HV + 882 and 0.138·HV + 290; 54 HRC is above the 570 HV at which the field ends here.
    ['C45', 'induction-hardened', '500 HV', 1153, 359], // 1152.5 and 359
    ['42CrMo4', 'flame hardened', '54 HRC', 1190, 369],
    ['16MnCr5', 'case-hardened', '58–62 HRC', 1500, 425],
    ['1.7131', 'carburised', null, 1500, 425],
    ['31CrMoV9', 'gas nitrided', null, 1250, 420],
    ['42CrMo4', 'nitrided', null, 998, 363],
    ['C45', 'nitrocarburised', null, 650, 224],
    // Grey iron 1.033·HBW + 132 and 0.256·HBW + 8 at 170; nodular 1.434·HBW + 211 and 0.350·HBW + 119 at 180.
    ['EN-GJL-250', null, null, 308, 52],
    ['EN-GJS-500-7', null, null, 469, 182],
  ])('rates %s, %s, %s', (material, treatment, hardness, contact, bending) => {
    expect(rated(material, treatment, hardness).strength).toMatchObject({ contact, bending });
  });

  it.each<[string | null, string | null, string | null, string]>([
    ['POM', null, null, 'POM is not rated'],
    ['CuZn39Pb3', null, null, 'CuZn39Pb3 is not rated'],
    ['steel', null, null, 'steel is not rated'],
    ['1.4301', null, null, '1.4301 is not rated'],
    ['16MnCr5', 'brushed', null, 'the treatment “brushed” is not rated'],
    ['EN-GJL-250', 'case-hardened', null, 'EN-GJL-250, case-hardened, is not rated'],
    ['16MnCr5', 'case-hardened', '50 HRC', '16MnCr5 is rated from 650 HV, case-hardened'],
    [null, null, null, 'the material is not known'],
  ])('does not rate %s, %s, %s, and says why', (material, treatment, hardness, reason) => {
    expect(rated(material, treatment, hardness)).toEqual({ strength: null, reason });
  });

  it('says with every figure that it is typical and where it comes from', () => {
    for (const { origin } of MATERIAL_FIELDS) expect(origin).toMatch(/ISO 6336-5.*confirm with the supplier/);
    expect(rated('C45').strength?.basis).toContain('normalised steel, 179 HV: ISO 6336-5');
  });
});

describe('isSurfaceHardened', () => {
  it.each<[string | null, boolean]>([
    ['case-hardened', true],
    ['induction hardened', true],
    ['nitrided', true],
    ['quenched and tempered', false],
    ['normalised', false],
    [null, false],
    // Unknown words are taken for hardened: somebody has to look.
    ['secret process', true],
  ])('%s: %s', (text, hardened) => {
    expect(isSurfaceHardened(text)).toBe(hardened);
  });
});

describe('isSofterThanSteel', () => {
  it.each(['POM', 'acetal', 'PA 6 G', 'PA66', 'PEEK', 'CuZn39Pb3', 'brass', 'EN AW-6082', 'EN AC-AlSi10Mg'])(
    '%s is',
    (material) => {
      expect(isSofterThanSteel(material)).toBe(true);
    },
  );
  it.each(['C45', '16MnCr5', 'X17CrNi16-2', '1.4301', 'EN-GJL-250', 'steel', 'secret stuff', null])(
    '%s is not, as far as is known',
    (material) => {
      expect(isSofterThanSteel(material)).toBe(false);
    },
  );
});
