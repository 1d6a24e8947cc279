/** A place without what does not tell places apart: blanks around and doubled, and how an accent was typed. */
export function plainPlace(written: string): string {
  return written.normalize('NFC').trim().replace(/\s+/g, ' ');
}

/** Places that are one, whatever the case of their letters, have one key. @param place as `plainPlace` gives it */
export function placeKey(place: string): string {
  return place.toLowerCase();
}

/** The database does not tell capitals from small letters of these; of others, such as Ü and ü, it does. */
export function isAscii(place: string): boolean {
  return [...place].every((letter) => letter <= '~');
}
