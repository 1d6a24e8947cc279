// ISO 4217 active currencies of general use, by the number of decimals of their minor unit (list from memory).
const WITHOUT_DECIMALS = 'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX VND VUV XAF XOF XPF';
const WITH_THREE = 'BHD IQD JOD KWD LYD OMR TND';
const WITH_TWO =
  'AED AFN ALL AMD AOA ARS AUD AWG AZN BAM BBD BDT BGN BMD BND BOB BRL BSD BTN BWP BYN BZD CAD CDF CHF CNY COP ' +
  'CRC CUP CVE CZK DKK DOP DZD EGP ERN ETB EUR FJD FKP GBP GEL GHS GIP GMD GTQ GYD HKD HNL HTG HUF IDR ILS INR ' +
  'IRR JMD KES KGS KHR KPW KYD KZT LAK LBP LKR LRD LSL MAD MDL MGA MKD MMK MNT MOP MRU MUR MVR MWK MXN MYR MZN ' +
  'NAD NGN NIO NOK NPR NZD PAB PEN PGK PHP PKR PLN QAR RON RSD RUB SAR SBD SCR SDG SEK SGD SHP SLE SOS SRD SSP ' +
  'STN SVC SYP SZL THB TJS TMT TOP TRY TTD TWD TZS UAH USD UYU UZS VES WST XCD YER ZAR ZMW ZWG';

const DECIMALS: ReadonlyMap<string, 0 | 2 | 3> = new Map([
  ...WITHOUT_DECIMALS.split(' ').map((code) => [code, 0] as const),
  ...WITH_TWO.split(' ').map((code) => [code, 2] as const),
  ...WITH_THREE.split(' ').map((code) => [code, 3] as const),
]);

/** Decimals of the currency's minor unit (0, 2 or 3), or undefined for a code that is not on the list. */
export function currencyDecimals(code: string): 0 | 2 | 3 | undefined {
  return DECIMALS.get(code);
}

/** Every currency code known here, sorted. */
export const CURRENCY_CODES: readonly string[] = [...DECIMALS.keys()].sort();
