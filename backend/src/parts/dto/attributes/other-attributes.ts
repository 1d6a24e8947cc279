/** Anything else: the description and the note say what it is. */
export class OtherAttributes {}
