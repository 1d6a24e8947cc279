import { statedHardness } from './hardness.js';
import { MATERIAL_FIELDS, type MaterialField, type MaterialGroup, type Treatment } from './materials.js';

/** What is known of a gear's material. */
export interface StatedMaterial {
  /** `C45`, `steel 16MnCr5`, `1.7131`, `EN-GJL-250`; null when it is not known. */
  material: string | null;
  /** `case-hardened`; null: as delivered. */
  heatTreatment: string | null;
  /** `58–62 HRC`; null: what is usual. */
  hardness: string | null;
}

/** Typical allowable stress numbers, N/mm². */
export interface MaterialStrength {
  /** σ_Hlim */
  contact: number;
  /** σ_Flim */
  bending: number;
  /** Which field of the table, the hardness counted, and where the figures come from. */
  basis: string;
}

/** Names of materials by group: EN short names, older ones, material numbers. Others are not rated. */
const GROUP_NAMES: readonly (readonly [MaterialGroup, RegExp])[] = [
  ['case-hardening steel', /^(16MnCr5|20MnCr5|16MnCrS5|20MnCrS5|18CrNiMo7-?6|17CrNiMo6|20NiCrMo2-?2|C15E?|1\.7131|1\.7139|1\.7147|1\.6587|1\.1141)$/i],
  ['nitriding steel', /^(31CrMoV9|34CrAlNi7(-10)?|1\.8519|1\.8550)$/i],
  ['alloy steel', /^(42CrMoS?4|34CrNiMo6|41Cr4|34CrMo4|30CrNiMo8|1\.7225|1\.6582|1\.7035|1\.7220|1\.6580)$/i],
  ['carbon steel', /^(C(35|40|45|50|55|60)[ER]?|1\.0503|1\.1191|1\.1201|1\.0501|1\.0601)$/i],
  ['structural steel', /^((S(235|275|355)|E(295|335|360))([JK]\w+)?|1\.0038|1\.0570|1\.0577)$/i],
  ['grey iron', /^(EN-?GJL-?\d{3}|GG-?\d{2})$/i],
  ['nodular iron', /^(EN-?GJS-?\d{3}(-\d+)?|GGG-?\d{2})$/i],
]; // prettier-ignore

/** Plastics, brass and aluminium by name: as gears they bear less than any steel or iron of the table (common practice). */
const SOFT_NAMES =
  /^(POM|PA ?\d|PA-|PE(EK|T|-|\d|$)|PC\b|PBT|PTFE|acetal|nylon|CuZn|brass|EN AW|EN AC|Al[A-Z]|alumini)/i;

/** In the order they are tried: “nitrocarburised” holds “carburised”, a tempered steel is hardened too. */
const TREATMENT_NAMES: readonly (readonly [Treatment, RegExp])[] = [
  ['nitrocarburised', /nitro-?carburi[sz]/i],
  ['nitrided', /nitrid/i],
  ['case-hardened', /case[- ]?hard|carburi[sz]/i],
  ['induction-hardened', /(induction|flame)[- ]?hard/i],
  ['quenched and tempered', /temper|through[- ]?hard|\+QT/i],
  ['as delivered', /^(normali[sz]ed|annealed|as delivered|as rolled|none|untreated|\+N)$/i],
];

/** Short marks of the state of delivery that follow a name: `C45+N`, `42CrMo4+QT`. */
const DELIVERY = /\+(N|QT|A|AR|C)$/i;

/**
 * Typical strength of a gear material after its treatment. Where the stated hardness lies above the field of the
 * table, the field's end counts; where none is stated, what is usual.
 * @returns null with the reason when the table does not rate it
 */
export function strengthOf(stated: StatedMaterial): { strength: MaterialStrength | null; reason: string } {
  const unrated = (reason: string) => ({ strength: null, reason });
  if (!stated.material) return unrated('the material is not known');
  const group = groupOf(stated.material);
  if (group === null) return unrated(`${stated.material} is not rated`);
  const treatment = treatmentOf(stated);
  if (treatment === null) return unrated(`the treatment “${stated.heatTreatment ?? ''}” is not rated`);
  const field = MATERIAL_FIELDS.find(
    ({ groups, treatments }) => groups.includes(group) && treatments.includes(treatment),
  );
  if (!field) return unrated(`${stated.material}, ${treatment}, is not rated`);
  const hardness = statedHardness(stated.hardness) ?? field.usualHv[group] ?? field.leastHv;
  // Conversions between hardness scales are good to a few HV.
  if (hardness < field.leastHv - 0.5) {
    return unrated(`${stated.material} is rated from ${Math.round(field.leastHv)} HV, ${treatment}`);
  }
  return { strength: strengthAt(field, Math.min(hardness, field.greatestHv)), reason: '' };
}

/** Whether gears of the material bear less than any steel or iron that `strengthOf` rates; false where it is not known. */
export function isSofterThanSteel(material: string | null): boolean {
  return material !== null && SOFT_NAMES.test(material.trim());
}

/** Whether the teeth were hardened so that a bore can no longer be turned without more ado. */
export function isSurfaceHardened(heatTreatment: string | null): boolean {
  const treatment = treatmentOf({ material: null, heatTreatment });
  return treatment !== 'as delivered' && treatment !== 'quenched and tempered';
}

function strengthAt({ name, contact, bending, origin }: MaterialField, hardness: number): MaterialStrength {
  return {
    contact: Math.round(contact.slope * hardness + contact.base),
    bending: Math.round(bending.slope * hardness + bending.base),
    basis: `${name}, ${Math.round(hardness)} HV: ${origin}`,
  };
}

/** The words of a material one by one: `steel C45 (1.0503)` names C45 and 1.0503. */
function groupOf(material: string): MaterialGroup | null {
  const words = material.split(/[\s,;()/]+/).map((word) => word.replace(DELIVERY, ''));
  const whole = words.join('');
  return GROUP_NAMES.find(([, name]) => [...words, whole].some((word) => name.test(word)))?.[0] ?? null;
}

function treatmentOf({
  material,
  heatTreatment,
}: Pick<StatedMaterial, 'material' | 'heatTreatment'>): Treatment | null {
  const text = heatTreatment?.trim() || (material?.match(DELIVERY)?.[0] ?? '');
  if (text === '') return 'as delivered';
  return TREATMENT_NAMES.find(([, name]) => name.test(text))?.[0] ?? null;
}
