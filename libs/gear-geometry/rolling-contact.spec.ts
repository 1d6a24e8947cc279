import { describe, expect, it } from 'vitest';
import { gearRadii, meshGeometry, meshInterferes, type GearInput } from './index.js';
import { cornerBite } from './tip-corner.js';
import { type EnvelopeGear } from './testing/rack-envelope.js';
import { RollingPair } from './testing/rolling-pair.js';

interface PairCase {
  pinion: EnvelopeGear;
  wheel: EnvelopeGear;
  allowance?: number;
}

function inputOf(gear: EnvelopeGear): GearInput {
  return {
    teeth: gear.z,
    module: gear.m ?? 1,
    pressureAngleDeg: gear.alphaDeg ?? 20,
    helixAngleDeg: gear.betaDeg ?? 0,
    profileShift: gear.x ?? 0,
    tipShortening: gear.tipShortening ?? 0,
    rack: { tipRadius: gear.tipRadius ?? 0.38 },
  };
}

function meshOf({ pinion, wheel, allowance = 0 }: PairCase) {
  return meshGeometry({ pinion: inputOf(pinion), wheel: inputOf(wheel), allowance });
}

describe('two rolling outlines', () => {
  it.each<PairCase>([
    { pinion: { z: 20 }, wheel: { z: 40 } },
    { pinion: { z: 12 }, wheel: { z: 24 } },
    { pinion: { z: 9 }, wheel: { z: 40 }, allowance: 0.1 },
    { pinion: { z: 17 }, wheel: { z: 17 }, allowance: 0.3 },
    { pinion: { z: 12, x: 0.3, m: 3 }, wheel: { z: 60, x: -0.3, m: 3 } },
    { pinion: { z: 12, x: 0.4, tipShortening: 0.1 }, wheel: { z: 24, x: 0.2, tipShortening: 0.1 } },
    { pinion: { z: 10, betaDeg: 20 }, wheel: { z: 30, betaDeg: 20 } },
    { pinion: { z: 12 }, wheel: { z: 12 } },
    {
      pinion: { z: 14, alphaDeg: 25, tipRadius: 0.3 },
      wheel: { z: 20, alphaDeg: 25, tipRadius: 0.3 },
      allowance: 0.05,
    },
  ])('touch for the contact ratio and leave the backlash that the formulas give: %o', (row) => {
    const mesh = meshOf(row);
    const pair = new RollingPair(row.pinion, row.wheel, mesh.centreDistance);
    expect(Math.abs(pair.contactRatio() - mesh.contactRatio)).toBeLessThan(5e-4);
    const arcmin = (pair.play(0) * 180 * 60) / Math.PI;
    expect(Math.abs(arcmin - mesh.angularBacklashArcmin)).toBeLessThan(1e-6);
  });

  it('jam below the zero-backlash distance by as much as the formulas say', () => {
    const row: PairCase = { pinion: { z: 18 }, wheel: { z: 30 }, allowance: -0.05 };
    const mesh = meshOf(row);
    const pair = new RollingPair(row.pinion, row.wheel, mesh.centreDistance);
    const arcmin = (pair.play(0) * 180 * 60) / Math.PI;
    expect(arcmin).toBeLessThan(-5);
    expect(arcmin).toBeCloseTo(mesh.angularBacklashArcmin, 5);
    expect(mesh.findings.map((finding) => finding.code)).toContain('no-backlash');
  });

  const codesAbout = (row: PairCase) => meshOf(row).findings.map((finding) => finding.code);

  it.each<PairCase>([
    { pinion: { z: 8 }, wheel: { z: 100 }, allowance: -0.2 },
    { pinion: { z: 8 }, wheel: { z: 100 }, allowance: -0.1 },
    { pinion: { z: 10, x: -0.3 }, wheel: { z: 60, x: -0.3 } },
    { pinion: { z: 10, x: -0.5 }, wheel: { z: 100, x: -0.5 } },
  ])('bite where interference is reported: %o', (row) => {
    const a = meshOf(row).centreDistance;
    const [pinion, wheel] = [gearRadii(inputOf(row.pinion)), gearRadii(inputOf(row.wheel))];
    const depth = new RollingPair(row.pinion, row.wheel, a).cornerDepth();
    expect(depth).toBeGreaterThan(1e-3);
    // The trial steps over the profile in hundredths of a module, hence the margin.
    expect(Math.abs(cornerBite(pinion, wheel, a) - depth)).toBeLessThan(1e-3);
    expect(meshInterferes(pinion, wheel, a)).toBe(true);
    expect(codesAbout(row)).toContain('interference');
  });

  it.each<PairCase>([
    { pinion: { z: 8 }, wheel: { z: 100 } },
    { pinion: { z: 7 }, wheel: { z: 60 } },
    { pinion: { z: 12, tipRadius: 0.1 }, wheel: { z: 100, tipRadius: 0.1, x: -0.4 } },
    { pinion: { z: 16, tipRadius: 0, alphaDeg: 14.5 }, wheel: { z: 100, tipRadius: 0, alphaDeg: 14.5 } },
  ])('run clear where contact is only lost to undercut: %o', (row) => {
    const a = meshOf(row).centreDistance;
    const [pinion, wheel] = [gearRadii(inputOf(row.pinion)), gearRadii(inputOf(row.wheel))];
    expect(new RollingPair(row.pinion, row.wheel, a).cornerDepth()).toBe(0);
    expect(meshInterferes(pinion, wheel, a)).toBe(false);
    expect(codesAbout(row)).toContain('contact-lost');
    expect(codesAbout(row)).not.toContain('interference');
  });
});
