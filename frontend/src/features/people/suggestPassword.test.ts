import { describe, expect, it } from 'vitest';
import { suggestPassword } from './suggestPassword';

describe('suggestPassword', () => {
  it('gives four groups of signs that cannot be mistaken for each other, never the same twice', () => {
    const made = Array.from({ length: 200 }, suggestPassword);
    for (const password of made) {
      expect(password).toMatch(/^[a-z2-9]{4}(-[a-z2-9]{4}){3}$/);
      expect(password).not.toMatch(/[ilo]/);
    }
    expect(new Set(made).size).toBe(made.length);
  });
});
