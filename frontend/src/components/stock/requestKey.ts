/** A new key for a request, so that sending it twice books once. */
export function newRequestKey(): string {
  // `randomUUID` needs a secure context; a phone in the workshop may reach the server over plain HTTP.
  if (typeof crypto.randomUUID === 'function') return crypto.randomUUID();
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
