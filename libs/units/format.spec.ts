import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  degToRad,
  diametralPitchToModule,
  formatAngle,
  formatArcmin,
  formatContactRatio,
  formatErrorPercent,
  formatLength,
  formatMass,
  formatModule,
  formatPower,
  formatSpeed,
  formatTorque,
  InputError,
  moduleToDiametralPitch,
  parseQuantity,
  radToArcmin,
  radToDeg,
  type QuantityKind,
} from './index.js';

const MINUS = '\u2212';

describe('formatting', () => {
  it('shows each kind with its unit', () => {
    expect(formatLength(56.4999)).toBe('56.50 mm');
    expect(formatLength(-0.004)).toBe('0.00 mm');
    expect(formatAngle(26.0886)).toBe('26.089°');
    expect(formatArcmin(12.44)).toBe('12.4′');
    expect(formatContactRatio(1.6352)).toBe('1.635');
    expect(formatMass(0.0354)).toBe('0.035 kg');
    expect(formatMass(12.4)).toBe('12.40 kg');
    expect(formatMass(240.46)).toBe('240.5 kg');
    expect(formatTorque(45)).toBe('45.00 N·m');
    expect(formatSpeed(1400)).toBe('1,400.0 rpm');
    expect(formatPower(0.1724)).toBe('0.172 kW');
  });

  it('signs the ratio error with a real minus', () => {
    expect(formatErrorPercent(0.26667)).toBe('+0.267 %');
    expect(formatErrorPercent(-0.13333)).toBe(`${MINUS}0.133 %`);
    expect(formatErrorPercent(0)).toBe('0.000 %');
    expect(formatErrorPercent(-0.0001)).toBe('0.000 %');
    expect(formatErrorPercent(0.0001)).toBe('0.000 %');
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, null, undefined])('shows %s as a dash', (figure) => {
    for (const format of [formatLength, formatErrorPercent, formatMass, formatModule, formatSpeed]) {
      expect(format(figure)).toBe('\u2013');
    }
  });

  it('shows module and diametral pitch both ways', () => {
    expect(formatModule(1.25)).toBe('m 1.25 (DP 20.32)');
    expect(formatModule(3)).toBe('m 3 (DP 8.467)');
    // 1 inch = 25.4 mm: diametral pitch 6 is module 4.2333 mm.
    expect(diametralPitchToModule(6)).toBeCloseTo(4.2333, 4);
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 100, noNaN: true }), (module) => {
        expect(diametralPitchToModule(moduleToDiametralPitch(module)) / module).toBeCloseTo(1, 14);
      }),
    );
  });
});

describe('angles', () => {
  it('converts both ways', () => {
    expect(degToRad(180)).toBe(Math.PI);
    expect(radToDeg(Math.PI / 6)).toBeCloseTo(30, 13);
    expect(radToArcmin(degToRad(0.5))).toBeCloseTo(30, 12);
  });
});

describe('parseQuantity', () => {
  it.each<[string, QuantityKind, number]>([
    ['45 N·m', 'torque', 45],
    ['45', 'torque', 45],
    ['45Nm', 'torque', 45],
    ['4500 N mm', 'torque', 4.5],
    ['1,400 rpm', 'speed', 1400],
    ['1400 min⁻¹', 'speed', 1400],
    ['1400 1/min', 'speed', 1400],
    ['0.75 kW', 'power', 0.75],
    ['750 W', 'power', 0.75],
    // Mechanical horsepower, 550 ft·lbf/s = 745.700 W.
    ['1 hp', 'power', 0.7457],
    // 1 lbf·in = 0.112985 N·m; 1 psi = 6894.76 Pa (NIST SP 811).
    ['100 lbf·in', 'torque', 11.2985],
    ['6417 psi', 'stress', 44.2437],
    ['425 N/mm²', 'stress', 425],
    ['1.5 in', 'length', 38.1],
    ['4.667 "', 'length', 118.5418],
    ['-0.05 mm', 'length', -0.05],
    [`${MINUS}50 µm`, 'length', -0.05],
    ['20°', 'angle', 20],
    ['30 arcmin', 'angle', 0.5],
    ['0.2°', 'arcmin', 12],
    ['100 rad/s', 'speed', 954.9297],
    ['25 1/s', 'speed', 1500],
    ['20 cN·m', 'torque', 0.2],
    ['1.5 kN·m', 'torque', 1500],
    // 1 lbf·ft = 1.355818 N·m (NIST SP 811).
    ['10 lbf·ft', 'torque', 13.5582],
    ['500 kPa', 'stress', 0.5],
    ['210 GPa', 'stress', 210_000],
    ['40 bar', 'stress', 4],
    ['2.5 cm', 'length', 25],
    ['0.4 m', 'length', 400],
    ['1 ft', 'length', 304.8],
    ['0.5 rad', 'angle', 28.6479],
    ['0.01 rad', 'arcmin', 34.3775],
    ['0.5 t', 'mass', 500],
    ['10 lb', 'mass', 4.5359],
    ['5 ‰', 'percent', 0.5],
    ['200 ppm', 'percent', 0.02],
    ['1.2 kg', 'mass', 1.2],
    ['35 g', 'mass', 0.035],
    ['m 1.25 (DP 20.32)', 'module', 1.25],
    ['2.5', 'module', 2.5],
    ['DP 12.7', 'module', 2],
    ['12.7 DP', 'module', 2],
    ['1 %', 'percent', 1],
    ['1.5e2', 'length', 150],
  ])('reads %s', (text, kind, value) => {
    expect(parseQuantity(text, kind)).toBeCloseTo(value, 3);
  });

  it.each<[string, QuantityKind]>([
    ['', 'length'],
    ['mm', 'length'],
    ['12 kg', 'length'],
    ['1,5 mm', 'length'],
    ['0,125 mm', 'length'],
    ['1.2.3', 'length'],
    ['NaN', 'torque'],
    ['Infinity', 'torque'],
    ['1e999', 'length'],
    ['5 constructor', 'length'],
    ['5 MW', 'power'],
    ['DP 0', 'module'],
  ])('refuses “%s” as %s', (text, kind) => {
    expect(() => parseQuantity(text, kind, 'duty.outputTorque')).toThrow(InputError);
    try {
      parseQuantity(text, kind, 'duty.outputTorque');
    } catch (error) {
      expect((error as InputError).errors[0]?.field).toBe('duty.outputTorque');
    }
  });

  it('refuses a text of 100,000 characters shortly', () => {
    expect(() => parseQuantity('7'.repeat(100_000), 'length')).toThrow(/^.{1,200}$/);
  });

  it('what is written reads back to the digits shown', () => {
    const cases: [(value: number) => string, QuantityKind, number][] = [
      [formatLength, 'length', 0.005],
      [formatAngle, 'angle', 0.0005],
      [formatArcmin, 'arcmin', 0.05],
      [formatTorque, 'torque', 0.005],
      [formatSpeed, 'speed', 0.05],
      [formatPower, 'power', 0.0005],
      [formatErrorPercent, 'percent', 0.0005],
      [formatMass, 'mass', 0.05],
    ];
    fc.assert(
      fc.property(
        fc.constantFrom(...cases),
        fc.double({ min: -1e5, max: 1e5, noNaN: true }),
        (row, value) => {
          const [format, kind, halfDigit] = row;
          const back = parseQuantity(format(value), kind);
          expect(Math.abs(back - value)).toBeLessThanOrEqual(halfDigit * (1 + 1e-6) + 1e-9);
        },
      ),
    );
  });

  it('a module written out reads back', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), (hundredths) => {
        expect(parseQuantity(formatModule(hundredths / 100), 'module')).toBe(hundredths / 100);
      }),
    );
  });
});
