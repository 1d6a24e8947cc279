import { describe, expect, it } from 'vitest';
import { meshGeometry, type Finding, type MeshInput } from './index.js';

const pinion = { teeth: 20, module: 2 };
const wheel = { teeth: 40, module: 2 };

function findingsOf(input: Partial<MeshInput>): Map<string, Finding> {
  const { findings } = meshGeometry({ pinion, wheel, ...input });
  return new Map(findings.map((finding) => [finding.code, finding]));
}

/** Both gears with the same change, so that they still mesh. */
function both(change: Partial<MeshInput['pinion']>): Partial<MeshInput> {
  return { pinion: { ...pinion, ...change }, wheel: { ...wheel, ...change } };
}

describe('findings', () => {
  it('are none for an everyday pair', () => {
    expect([...findingsOf({}).keys()]).toEqual([]);
    expect([...findingsOf({ allowance: 0.1 }).keys()]).toEqual([]);
  });

  it('fail a pair that loses continuous contact, with the ratio and both limits', () => {
    const found = findingsOf({ allowance: 1.2 });
    const { contactRatio } = meshGeometry({ pinion, wheel, allowance: 1.2 });
    expect(contactRatio).toBeLessThan(1);
    expect(found.get('contact-not-continuous')).toMatchObject({
      severity: 'fail',
      value: contactRatio,
      limit: 1,
    });
    expect(found.get('contact-ratio-low')).toMatchObject({
      severity: 'fail',
      value: contactRatio,
      limit: 1.2,
    });
  });

  it('judge the ratio against the least one asked for, the limit itself included', () => {
    const least = 1.4;
    const { allowanceAtLeastContactRatio } = meshGeometry({ pinion, wheel, leastContactRatio: least });
    const allowance = allowanceAtLeastContactRatio ?? Number.NaN;
    expect(findingsOf({ leastContactRatio: least, allowance }).has('contact-ratio-low')).toBe(false);
    const beyond = { leastContactRatio: least, allowance: allowance + 1e-4 };
    expect(findingsOf(beyond).get('contact-ratio-low')).toMatchObject({ limit: least });
  });

  it('ask for a face width where only the helix could keep the contact', () => {
    const helical = both({ helixAngleDeg: 20 });
    expect(findingsOf({ ...helical, allowance: 1.2 }).get('face-width-missing')?.severity).toBe('marginal');
    const wide = both({ helixAngleDeg: 20, faceWidth: 40 });
    const found = findingsOf({ ...wide, allowance: 1.2 });
    expect(found.has('face-width-missing')).toBe(false);
    expect(found.has('contact-not-continuous')).toBe(false);
  });

  it('tell a small tip clearance from tips that hit the root', () => {
    const small = findingsOf(both({ rack: { dedendum: 1.05 } })).get('tip-clearance-low');
    expect(small?.severity).toBe('marginal');
    expect(small?.value).toBeCloseTo(0.05 * 2, 9);
    expect(small?.limit).toBeCloseTo(0.12 * 2, 9);
    const hit = findingsOf(both({ rack: { addendum: 1.3 } })).get('tip-hits-root');
    expect(hit?.severity).toBe('fail');
    expect(hit?.value).toBeCloseTo(-0.05 * 2, 9);
  });

  it('fail interference below the usable involute of a gear without undercut', () => {
    const long = { pinion: { teeth: 18, module: 2 }, wheel: { teeth: 200, module: 2, tipShortening: -0.3 } };
    const found = findingsOf(long);
    expect(found.get('interference')?.severity).toBe('fail');
    expect(found.has('undercut')).toBe(false);
    expect(found.get('interference')?.message).toMatch(/wheel's tip.*pinion's usable involute/);
  });

  it('fail jamming teeth and say from which distance they turn', () => {
    const jam = findingsOf({ centreDistance: 59.9 }).get('no-backlash');
    expect(jam?.severity).toBe('fail');
    expect(jam?.message).toContain('60 mm');
    expect(findingsOf({ centreDistance: 60 }).has('no-backlash')).toBe(false);
  });

  it('measure thin tips of the tooth as cut', () => {
    // published.md: z 12, x 0.6 is 0.2018 m thick at the tip (formula): 0.002 m above the house limit.
    const shifted = { teeth: 12, module: 2, profileShift: 0.6 };
    expect(findingsOf({ pinion: shifted }).has('tip-thin')).toBe(false);
    const thinned = { ...shifted, thicknessAllowance: { upper: -0.02, lower: -0.04 } };
    expect(findingsOf({ pinion: thinned }).get('tip-thin')?.severity).toBe('fail');
  });

  it('stand with the gravest first', () => {
    const { findings } = meshGeometry({
      pinion: { teeth: 9, module: 1 },
      wheel: { teeth: 80, module: 1 },
      allowance: 0.5,
    });
    const order = findings.map((finding) => ['fail', 'marginal', 'note'].indexOf(finding.severity));
    expect(order).toEqual(order.toSorted((a, b) => a - b));
    expect(new Set(order).size).toBeGreaterThan(1);
  });
});
