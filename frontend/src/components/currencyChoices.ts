/** Currencies that most trade is in, for the choices of a filter; any other one is reached by its address. */
export const CURRENCY_CHOICES = [
  'EUR',
  'USD',
  'GBP',
  'CHF',
  'SEK',
  'NOK',
  'DKK',
  'PLN',
  'CZK',
  'JPY',
  'CNY',
].map((code) => ({ value: code, name: code }));
