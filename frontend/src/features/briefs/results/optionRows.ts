import { formatNumber } from '@stageyard/libs/units';
import type { OptionSupply, TrainOption } from '../../../api/types';
import {
  boxWords,
  errorWords,
  exactRatioWords,
  leastContactWords,
  moduleWords,
  ratioWords,
  teethWords,
} from '../../../components/optionWords';
import { plainCost, pricedWords } from '../../../components/supplyWords';

/** Heads of the copied table; units stand in them as on screen. */
export const OPTION_HEADS = [
  'Stages',
  'Teeth',
  'Module',
  'Ratio',
  'Exact ratio',
  'Error %',
  'Centre-distance sum mm',
  'Box mm',
  'Mass kg',
  'Least contact ratio',
  'Backlash arcmin',
];

/** One option as the cells of the copied table: plain minus signs, so that a spreadsheet reads numbers. */
export function optionRow(option: TrainOption): string[] {
  return [
    String(option.stages.length),
    teethWords(option.stages),
    moduleWords(option.stages),
    ratioWords(option.ratio.value),
    exactRatioWords(option.ratio),
    errorWords(option.ratio.errorPercent).replace('\u2212', '-'),
    formatNumber(option.centreDistanceSum, 2),
    boxWords(option.box),
    formatNumber(option.mass, 3),
    leastContactWords(option),
    formatNumber(option.backlashArcmin, 1),
  ];
}

/** Heads of what the copied table says of cost and stock: a column a currency, so that a spreadsheet can add them. */
export const supplyHeads = (quantity: number, currencies: readonly string[]): string[] => [
  ...currencies.map((currency) => `Cost of ${quantity} ${currency}`),
  'Priced',
  'Gears',
  'On the shelf',
  'To make',
  'Longest lead time days',
];

/** Cost and stock of one option as the cells under `supplyHeads`; blanks where nothing is known. */
export function supplyCells(supply: OptionSupply | undefined, currencies: readonly string[]): string[] {
  if (!supply) return [...currencies.map(() => ''), '', '', '', '', ''];
  const { gears, onShelf, toMake, longestLeadTimeDays } = supply;
  return [
    ...currencies.map((currency) => plainCost(supply, currency)),
    pricedWords(supply) || 'all priced',
    String(gears),
    String(onShelf),
    String(toMake),
    longestLeadTimeDays === null ? '' : String(longestLeadTimeDays),
  ];
}
