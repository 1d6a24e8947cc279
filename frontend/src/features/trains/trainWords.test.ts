import { describe, expect, it } from 'vitest';
import { massWords, partNumberWords } from './bom/bomCells';
import { readTab, tallyOf } from './trainWords';

describe('the pages of a train', () => {
  it('opens the drawing when the address says nothing known', () => {
    expect(readTab(null)).toBe('drawing');
    expect(readTab('bom')).toBe('bom');
    expect(readTab('price')).toBe('drawing');
  });

  it('counts checks by verdict', () => {
    const check = { code: 'c', label: 'L', value: 1, limit: 1, unit: '', message: '' };
    const checks = (['passes', 'fails', 'passes', 'marginal'] as const).map((verdict) => ({
      ...check,
      verdict,
    }));
    expect(tallyOf({ checks, findings: [] })).toEqual({ passes: 2, marginal: 1, fails: 1, findings: 0 });
  });
});

describe('findings beside the checks', () => {
  const undercut = {
    code: 'undercut-pinion',
    label: 'L',
    value: 0,
    limit: 1,
    unit: '',
    message: '',
    stage: 0,
    verdict: 'fails' as const,
  };
  const finding = { severity: 'marginal' as const, message: 'M', stage: 0 };

  it('are counted once, and mere notes not at all', () => {
    const findings = [
      { ...finding, code: 'bore-differs' },
      { ...finding, code: 'undercut' },
      { ...finding, code: 'undercut', stage: 1 },
      { ...finding, code: 'said', severity: 'note' as const },
    ];
    expect(tallyOf({ checks: [undercut], findings }).findings).toBe(2);
  });
});

describe('bill of materials words', () => {
  it('says what a missing part number means', () => {
    expect(partNumberWords({ partNumber: null, supply: 'made' })).toBe('to be made');
    expect(partNumberWords({ partNumber: null, supply: 'bought' })).toBe('to be chosen');
    expect(partNumberWords({ partNumber: 'KW-00417', supply: 'bought' })).toBe('KW-00417');
  });

  it('never lets a light part read as weightless, nor an unknown mass as nought', () => {
    expect(massWords(0.0003)).toBe('0.0003');
    expect(massWords(0.074)).toBe('0.074');
    expect(massWords(null)).toBe('–');
  });
});
