import { isIPv4 } from 'node:net';

/**
 * Whether a `Host` value (name or address, with or without a port) names this machine itself:
 * `localhost`, 127.0.0.0/8 or `[::1]`.
 */
export function isLoopbackHost(host: string): boolean {
  const name = host.replace(/:\d{1,5}$/, '').toLowerCase();
  return name === 'localhost' || name === '[::1]' || isLoopbackAddress(name);
}

/** Whether a peer's address is this machine's own; also the form that IPv6 sockets give an IPv4 address. */
export function isLoopbackAddress(address: string): boolean {
  const plain = address.replace(/^::ffff:/i, '');
  return plain === '::1' || (isIPv4(plain) && plain.startsWith('127.'));
}
