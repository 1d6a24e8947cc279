import { describe, expect, it } from 'vitest';
import { refuseForeignWrites, refuseFromAfar } from './request-rules.js';

const demo = { demo: true };

describe('refuseFromAfar', () => {
  const near = { method: 'GET', headers: { host: 'localhost:3000' }, peer: '127.0.0.1' };

  it('lets this machine in', () => {
    expect(() => refuseFromAfar(near, demo)).not.toThrow();
  });

  it.each(['gears.example.com', '192.168.1.20:3000', 'localhost.example.com', undefined])(
    'refuses the Host %s in demo mode only',
    (host) => {
      const request = { ...near, headers: { host } };
      expect(() => refuseFromAfar(request, demo)).toThrow(/Demo mode/);
      expect(() => refuseFromAfar(request, { demo: false })).not.toThrow();
    },
  );

  it.each(['x-forwarded-for', 'x-forwarded-host', 'x-forwarded-proto', 'forwarded', 'x-real-ip', 'via'])(
    'refuses a request with the header %s, since others may stand behind it',
    (name) => {
      const headers = { ...near.headers, [name]: '127.0.0.1' };
      expect(() => refuseFromAfar({ ...near, headers }, demo)).toThrow(/Demo mode/);
    },
  );

  it('refuses another machine that names this one as Host', () => {
    expect(() => refuseFromAfar({ ...near, peer: '192.168.1.7' }, demo)).toThrow(/Demo mode/);
  });
});

describe('refuseForeignWrites', () => {
  const write = (headers: Record<string, string>) => ({
    method: 'POST',
    headers: { host: 'localhost:3000', ...headers },
    peer: '127.0.0.1',
  });
  const local = { publicUrl: null };

  it.each<Record<string, string>>([
    {},
    { origin: 'http://localhost:3000' },
    { 'sec-fetch-site': 'same-origin' },
  ])('lets %o pass', (headers) => {
    expect(() => refuseForeignWrites(write(headers), local)).not.toThrow();
  });

  it.each<Record<string, string>>([
    { origin: 'http://localhost:4000' },
    { origin: 'http://evil.example' },
    { origin: 'null' },
    { origin: '' },
    { 'sec-fetch-site': 'cross-site' },
    { 'sec-fetch-site': 'same-site' },
    { 'sec-fetch-site': 'same-origin', origin: 'http://evil.example' },
  ])('refuses %o', (headers) => {
    expect(() => refuseForeignWrites(write(headers), local)).toThrow(/another address/);
  });

  it('lets reading pass whatever its origin', () => {
    const request = {
      ...write({ origin: 'http://evil.example', 'sec-fetch-site': 'cross-site' }),
      method: 'GET',
    };
    expect(() => refuseForeignWrites(request, local)).not.toThrow();
  });

  it('compares with the public address behind a proxy, whatever Host the proxy sends', () => {
    const settings = { publicUrl: 'https://gears.example.com' };
    expect(() => refuseForeignWrites(write({ origin: 'https://gears.example.com' }), settings)).not.toThrow();
    expect(() => refuseForeignWrites(write({ origin: 'https://gears.example.org' }), settings)).toThrow();
  });
});
