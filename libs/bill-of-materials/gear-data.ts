import { type KitGear } from './kit.js';

/** One row of the data for the gear maker. A value that is not known is null and shown as not given. */
export interface GearDataRow {
  /** `blank`: dimensions of the body; `teeth`: the gear data proper; `mate`: the gear it runs with. */
  group: 'blank' | 'teeth' | 'mate';
  label: string;
  symbol: string;
  value: number | string | null;
  unit: '' | 'mm' | '°';
  /** Decimals to show a number with. */
  digits: number;
}

/** A gear with its bore and the gear it runs with. */
export interface GearDataInput extends Omit<KitGear, 'stage' | 'role'> {
  /** mm; null for a pinion cut on its shaft. */
  bore: number | null;
  mate: { teeth: number | null; partNumber: string | null; centreDistance: number | null };
}

/**
 * Data for the gear maker in the order of ISO 1340 (order from memory): dimensions of the body first, then the data
 * of the teeth, then the mate. Rack proportions and shift are in modules, lengths in mm, angles in degrees.
 * The span limits follow from the thickness allowance: W + A_s cos α.
 */
export function gearDataRows(gear: GearDataInput): GearDataRow[] {
  return [...blankRows(gear), ...toothRows(gear), ...thicknessRows(gear), ...mateRows(gear)];
}

function blankRows(gear: GearDataInput): GearDataRow[] {
  const figures = gear.figures ?? {};
  return [
    row('blank', 'Tip diameter', 'd_a', figures.tipDiameter, 'mm', 3),
    row('blank', 'Root diameter', 'd_f', figures.rootDiameter, 'mm', 3),
    row('blank', 'Face width', 'b', gear.faceWidth, 'mm', 2),
    row('blank', 'Bore', 'd_B', gear.bore ?? 'cut on its shaft', gear.bore === null ? '' : 'mm', 2),
    row('blank', 'Material', '', gear.material),
    row('blank', 'Heat treatment', '', gear.heatTreatment),
  ];
}

function toothRows(gear: GearDataInput): GearDataRow[] {
  const { figures = {}, rack } = gear;
  const depth =
    figures.tipDiameter === undefined || figures.rootDiameter === undefined
      ? null
      : (figures.tipDiameter - figures.rootDiameter) / 2;
  const basicRack = rack
    ? `ISO 53, h_aP ${rack.addendum}, h_fP ${rack.dedendum}, ρ_fP ${Number(rack.tipRadius.toFixed(4))}`
    : null;
  const hand = gear.helixAngleDeg === 0 ? 'spur' : (gear.hand ?? null);
  return [
    row('teeth', 'Normal module', 'm_n', gear.module, 'mm', 4),
    row('teeth', 'Number of teeth', 'z', gear.teeth),
    row('teeth', 'Basic rack', '', basicRack),
    row('teeth', 'Normal pressure angle', 'α_n', gear.pressureAngleDeg, '°', 4),
    row('teeth', 'Helix angle', 'β', gear.helixAngleDeg, '°', 4),
    row('teeth', 'Helix direction', '', hand),
    row('teeth', 'Reference diameter', 'd', figures.referenceDiameter, 'mm', 4),
    row('teeth', 'Base diameter', 'd_b', figures.baseDiameter, 'mm', 4),
    row('teeth', 'Form diameter', 'd_F', figures.formDiameter, 'mm', 3),
    row('teeth', 'Profile shift coefficient', 'x', gear.profileShift, '', 4),
    row('teeth', 'Tip shortening coefficient', 'k', gear.tipShortening ?? 0, '', 4),
    row('teeth', 'Tooth depth', 'h', depth, 'mm', 3),
    row('teeth', 'Tolerance class, ISO 1328-1', '', gear.accuracyGrade),
  ];
}

function thicknessRows(gear: GearDataInput): GearDataRow[] {
  const { figures = {}, thicknessAllowance: allowance } = gear;
  const cosAlpha = Math.cos((gear.pressureAngleDeg * Math.PI) / 180);
  const limit = (deviation: number | undefined) =>
    figures.spanLength === undefined || deviation === undefined
      ? null
      : figures.spanLength + deviation * cosAlpha;
  return [
    row('teeth', 'Normal tooth thickness', 's_n', figures.toothThickness, 'mm', 4),
    row('teeth', 'Thickness allowance, upper', 'E_sns', allowance?.upper, 'mm', 3),
    row('teeth', 'Thickness allowance, lower', 'E_sni', allowance?.lower, 'mm', 3),
    row('teeth', 'Teeth spanned', 'k', figures.spanTeeth),
    row('teeth', 'Span, nominal', 'W_k', figures.spanLength, 'mm', 4),
    row('teeth', 'Span, upper limit', 'W_k,s', limit(allowance?.upper), 'mm', 3),
    row('teeth', 'Span, lower limit', 'W_k,i', limit(allowance?.lower), 'mm', 3),
  ];
}

function mateRows({ mate }: GearDataInput): GearDataRow[] {
  return [
    row('mate', 'Centre distance', 'a', mate.centreDistance, 'mm', 3),
    row('mate', 'Mating gear, number of teeth', 'z', mate.teeth),
    row('mate', 'Mating gear, part number', '', mate.partNumber),
  ];
}

function row(
  group: GearDataRow['group'],
  label: string,
  symbol: string,
  value: number | string | null | undefined,
  unit: GearDataRow['unit'] = '',
  digits = 0,
): GearDataRow {
  return { group, label, symbol, value: value ?? null, unit, digits };
}
