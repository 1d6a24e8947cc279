import { boreFor, gearMass, hubFor } from './gear-blank.js';
import { type GearFamily } from './gear-families.js';

/** What the parts service needs to book one gear; attribute names are those of the part kind `gear`. */
export interface GearRow {
  kind: 'gear';
  description: string;
  standing: 'cleared' | 'draft' | 'withdrawn';
  material: string;
  mass: number;
  supply: 'bought';
  supplier: string;
  attributes: {
    teeth: number;
    module: number;
    pressureAngleDeg: number;
    helixAngleDeg: number;
    hand: 'left' | 'right' | null;
    profileShift: number | null;
    faceWidth: number;
    bore: number;
    hubDiameter: number | null;
    hubLength: number | null;
    heatTreatment: string | null;
    hardness: string | null;
  };
}

function gearRow(
  family: GearFamily,
  module: number,
  teeth: number,
  hand: 'left' | 'right' | null,
  index: number,
): GearRow {
  const faceWidth = Math.ceil(family.widthFactor * module);
  const blank = { teeth, module, helixAngleDeg: family.helixAngleDeg, faceWidth };
  const bore = boreFor(blank);
  const hub = family.hubbed ? hubFor(blank, bore) : null;
  const handWord = hand === null ? '' : `, ${hand} hand ${family.helixAngleDeg}°`;
  return {
    kind: 'gear',
    description: `${family.word}, ${teeth} teeth, module ${module}${handWord}`,
    // A real library is never all cleared: a few rows wait, a few are gone.
    standing: index % 97 === 50 ? 'draft' : index % 131 === 77 ? 'withdrawn' : 'cleared',
    material: family.material,
    mass: gearMass(blank, bore, hub, family.density),
    supply: 'bought',
    supplier: family.supplier,
    attributes: {
      teeth,
      module,
      pressureAngleDeg: 20,
      helixAngleDeg: family.helixAngleDeg,
      hand,
      profileShift: 0,
      faceWidth,
      bore,
      hubDiameter: hub?.diameter ?? null,
      hubLength: hub?.length ?? null,
      heatTreatment: family.heatTreatment,
      hardness: family.hardness,
    },
  };
}

/** All stock gears of these families, always in the same order. */
export function gearsOf(families: readonly GearFamily[]): GearRow[] {
  const rows: GearRow[] = [];
  for (const family of families) {
    const hands = family.helixAngleDeg === 0 ? ([null] as const) : (['right', 'left'] as const);
    for (const module of family.modules)
      for (const teeth of family.teeth)
        for (const hand of hands) rows.push(gearRow(family, module, teeth, hand, rows.length));
  }
  return rows;
}
