import { describe, expect, it } from 'vitest';
import { passwordMatches, hashPassword } from './passwords.js';
import { permissionsOf, PERMISSIONS, ROLE_PERMISSIONS } from './permissions.js';

describe('permissions', () => {
  it('add up over the roles of a person', () => {
    const both = permissionsOf(['librarian', 'designer']);
    expect(both).toEqual(expect.arrayContaining(['parts.edit', 'briefs.edit', 'trains.edit']));
    expect(both).not.toContain('people.manage');
    expect(permissionsOf([])).toEqual([]);
    expect(permissionsOf(['admin', 'viewer'])).toEqual(PERMISSIONS);
  });
});

describe('people who see prices', () => {
  it('are all those who write them, choose among them or take them out in a workbook', () => {
    const holders = Object.entries(ROLE_PERMISSIONS).filter(([, held]) =>
      (['prices.edit', 'offers.choose', 'bom.export', 'trains.edit'] as const).some((one) =>
        held.includes(one),
      ),
    );
    expect(holders.length).toBeGreaterThan(0);
    for (const [role, held] of holders) expect(held, role).toContain('prices.read');
    expect(permissionsOf(['viewer'])).not.toContain('prices.read');
  });
});

describe('passwords', () => {
  it('are kept as argon2id, each with a salt of its own', async () => {
    const [first, second] = await Promise.all([
      hashPassword('one and the same'),
      hashPassword('one and the same'),
    ]);
    expect(first).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(first).not.toBe(second);
    expect(await passwordMatches(first, 'one and the same')).toBe(true);
    expect(await passwordMatches(first, 'another')).toBe(false);
  });

  it('take as long to refuse for an unknown person as for a known one', async () => {
    const known = await hashPassword('something');
    await passwordMatches(null, 'warm up');
    const timeOf = async (hash: string | null) => {
      const begin = performance.now();
      for (let count = 0; count < 5; count += 1) expect(await passwordMatches(hash, 'guess')).toBe(false);
      return performance.now() - begin;
    };
    // Without the decoy the unknown one would take a thousandth: this bound is far from both.
    expect(await timeOf(null)).toBeGreaterThan((await timeOf(known)) / 10);
    expect(await passwordMatches(null, 'no account has this password')).toBe(false);
  });
});
