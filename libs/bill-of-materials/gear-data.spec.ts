import { describe, expect, it } from 'vitest';
import { buildBom, gearDataRows, trainGearData, type GearDataInput } from './index.js';
import { emptyLibrary, libraryOf, newKitGear, newPartRef, twoStageKit } from './testing/kit-builder.js';

// Kohara, Gear Technical Reference, standard spur gears (memory): m 3, z 24, x 0: d 72, d_b 67.658, d_a 78, d_f 64.5.
// Span of m 3, z 24, x 0.4 (memory): k 4, W 32.8266.
const gear: GearDataInput = {
  ...newKitGear({ stage: 1, role: 'wheel', teeth: 24, module: 3, faceWidth: 30 }),
  profileShift: 0.4,
  rack: { addendum: 1, dedendum: 1.25, tipRadius: 0.38 },
  thicknessAllowance: { upper: -0.05, lower: -0.1 },
  figures: {
    referenceDiameter: 72,
    tipDiameter: 80.4,
    rootDiameter: 66.9,
    spanTeeth: 4,
    spanLength: 32.8266,
  },
  accuracyGrade: 8,
  bore: 20,
  mate: { teeth: 12, partNumber: 'KW-00012', centreDistance: 55.1 },
};

const value = (label: string, from = gear) => gearDataRows(from).find((row) => row.label === label)?.value;

describe('gearDataRows', () => {
  it('states the body, then the teeth, then the mate', () => {
    const groups = gearDataRows(gear).map((row) => row.group);
    expect([...new Set(groups)]).toEqual(['blank', 'teeth', 'mate']);
    expect(groups).toEqual(
      [...groups].sort((a, b) => 'btm'.indexOf(a.charAt(0)) - 'btm'.indexOf(b.charAt(0))),
    );
    // ISO 1340 (order from memory): module, teeth, rack, pressure angle, helix, direction, then the shift.
    const labels = gearDataRows(gear).map((row) => row.label);
    const order = ['Normal module', 'Number of teeth', 'Basic rack', 'Helix angle', 'Helix direction'];
    const places = [...order, 'Reference diameter', 'Profile shift coefficient', 'Centre distance'].map(
      (label) => labels.indexOf(label),
    );
    expect(places).not.toContain(-1);
    expect(places).toEqual([...places].sort((a, b) => a - b));
    expect(new Set(labels).size).toBe(labels.length);
  });

  it('derives the tooth depth and the span limits', () => {
    expect(value('Tooth depth')).toBeCloseTo(6.75, 10);
    // ISO 21771: the span changes by the thickness allowance times cos α; cos 20° = 0.9396926.
    expect(value('Span, upper limit')).toBeCloseTo(32.8266 - 0.0469846, 6);
    expect(value('Span, lower limit')).toBeCloseTo(32.8266 - 0.0939693, 6);
  });

  it('leaves blank what is not known instead of inventing it', () => {
    const bare: GearDataInput = { ...gear, figures: {}, thicknessAllowance: null };
    for (const label of ['Tip diameter', 'Span, nominal', 'Span, upper limit', 'Tooth depth']) {
      expect(value(label, bare)).toBeNull();
    }
  });

  it('names spur gears, hands and pinions cut on their shaft', () => {
    expect(value('Helix direction')).toBe('spur');
    expect(value('Helix direction', { ...gear, helixAngleDeg: 15, hand: 'left' })).toBe('left');
    expect(value('Bore', { ...gear, bore: null })).toBe('cut on its shaft');
  });
});

describe('gear data on the bill of materials', () => {
  it('carries the mate and the centre distance of the stage', () => {
    const [pinion, wheel] = buildBom(twoStageKit(), emptyLibrary);
    const mates = [pinion, wheel].map((line) =>
      line?.gearData?.filter((row) => row.group === 'mate').map((row) => row.value),
    );
    expect(mates).toEqual([
      [60, 60, 'to be made'],
      [60, 20, 'to be made'],
    ]);
  });

  it('shows every mate of a gear that is used twice', () => {
    const kit = twoStageKit({ centreDistances: [60, 52.5] });
    const second = [
      newKitGear({ stage: 2, role: 'pinion', teeth: 20 }),
      newKitGear({ stage: 2, role: 'wheel', teeth: 50 }),
    ];
    const shafts = kit.shafts.map((shaft) => ({ ...shaft, diameter: 12 }));
    const lines = buildBom({ ...kit, gears: [...kit.gears.slice(0, 2), ...second], shafts }, emptyLibrary);
    const pinion = lines.find((line) => line.source.includes('Stage 2 pinion'));
    expect(pinion).toMatchObject({ quantity: 2, source: ['Stage 1 pinion', 'Stage 2 pinion'] });
    const mate = pinion?.gearData?.filter((row) => row.group === 'mate').map((row) => row.value);
    expect(mate).toEqual(['60; 52.5', '60; 50', 'to be made']);
  });
});

describe('trainGearData', () => {
  it('covers stock gears and gears to be made, in stage order', () => {
    const library = libraryOf({
      gear: (need) => (need.teeth === 60 ? newPartRef({ number: 'KW-00060', kind: 'gear' }) : null),
    });
    const data = trainGearData(twoStageKit(), library);
    expect(data.map((gear) => `${gear.stage} ${gear.role} ${gear.partNumber}`)).toEqual([
      '1 pinion null',
      '1 wheel KW-00060',
      '2 pinion null',
      '2 wheel null',
    ]);
    const mateNumber = data[0]?.rows.find((row) => row.label === 'Mating gear, part number');
    expect(mateNumber?.value).toBe('KW-00060');
    const ofWheel = data[1]?.rows.find((row) => row.label === 'Mating gear, part number');
    expect(ofWheel?.value).toBe('to be made');
  });

  it('takes material and heat treatment of a stock gear from the library', () => {
    const sizes = {
      teeth: 60,
      module: 1.5,
      pressureAngleDeg: 20,
      helixAngleDeg: 0,
      profileShift: 0,
      faceWidth: 15,
    };
    const gear = { ...sizes, hand: null, bore: 15, thicknessAllowance: null, heatTreatment: 'case-hardened' };
    const part = newPartRef({ number: 'KW-00060', kind: 'gear', material: '16MnCr5', gear });
    const library = libraryOf({ gear: (need) => (need.teeth === 60 ? part : null) });
    const wheel = trainGearData(twoStageKit(), library)[1]?.rows ?? [];
    const value = (label: string) => wheel.find((row) => row.label === label)?.value;
    expect([value('Material'), value('Heat treatment')]).toEqual(['16MnCr5', 'case-hardened']);
  });
});
