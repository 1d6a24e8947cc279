import type { Supplier } from '../../api/types';
import { formatCount } from '../../components/figures';
import { moneyWords } from '../../components/moneyText';

type FreightKind = Supplier['freight']['kind'];
type Language = Supplier['language'];

export const FREIGHT_NAMES: Record<FreightKind, string> = {
  included: 'included in the prices',
  flat: 'the same for every order',
  'free-from': 'free from an order value',
  'as-charged': 'as the carrier charges',
};

export const FREIGHT_KINDS = Object.keys(FREIGHT_NAMES) as FreightKind[];

/** The freight rule of one order in words. */
export function freightWords(freight: Supplier['freight'], currency: string): string {
  const { kind, charge = null, freeFrom = null } = freight;
  const charged = charge === null ? 'as charged' : moneyWords(charge, currency);
  switch (kind) {
    case 'included':
      return 'included in the prices';
    case 'flat':
      return charge === null ? 'a fixed charge' : `${charged} an order`;
    case 'free-from':
      return freeFrom === null
        ? `${charged} an order`
        : `${charged}, free from ${moneyWords(freeFrom, currency)}`;
    case 'as-charged':
      return 'as the carrier charges';
  }
}

const LANGUAGE_NAMES: Record<Language, string> = {
  en: 'English',
  de: 'German',
  fr: 'French',
  it: 'Italian',
  es: 'Spanish',
  pt: 'Portuguese',
  nl: 'Dutch',
  da: 'Danish',
  sv: 'Swedish',
  nb: 'Norwegian',
  fi: 'Finnish',
  pl: 'Polish',
  cs: 'Czech',
  ja: 'Japanese',
  zh: 'Chinese',
  ko: 'Korean',
  ar: 'Arabic',
  tr: 'Turkish',
};

export const languageName = (language: Language): string => LANGUAGE_NAMES[language];

export const LANGUAGE_CHOICES = Object.entries(LANGUAGE_NAMES).map(([value, name]) => ({ value, name }));

/** `42 open, 3 ended` */
export function offersWords({ open, expired }: Supplier['offers']): string {
  if (open === 0 && expired === 0) return 'none';
  const words = `${formatCount(open)} open`;
  return expired === 0 ? words : `${words}, ${formatCount(expired)} ended`;
}
