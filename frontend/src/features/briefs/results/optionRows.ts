import { formatNumber } from '@stageyard/libs/units';
import type { TrainOption } from '../../../api/types';
import {
  boxWords,
  errorWords,
  exactRatioWords,
  leastContactWords,
  moduleWords,
  ratioWords,
  teethWords,
} from '../../../components/optionWords';

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
