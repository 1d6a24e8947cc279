/** Without letters and digits that look alike on paper: the password is read out or written down once. */
const SIGNS = 'abcdefghjkmnpqrstuvwxyz23456789';
const GROUPS = 4;
const GROUP = 4;

/** A random password such as `k4mw-t9xe-zz3h-p2ca`: 16 signs of 31, about 79 bits. */
export function suggestPassword(): string {
  const even = 256 - (256 % SIGNS.length);
  let text = '';
  while (text.length < GROUPS * GROUP) {
    const [byte = 255] = crypto.getRandomValues(new Uint8Array(1));
    // The last few byte values would make some signs likelier than others.
    if (byte < even) text += SIGNS[byte % SIGNS.length] ?? '';
  }
  return (text.match(/.{4}/g) ?? []).join('-');
}
