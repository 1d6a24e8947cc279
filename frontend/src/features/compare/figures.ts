import { formatNumber, formatTrimmed } from '@stageyard/libs/units';
import type { SupplyByOption } from '../../api/hooks/useSearchSupply';
import type { OptionSupply, TrainOption } from '../../api/types';
import {
  boxVolume,
  boxWords,
  errorWords,
  exactRatioWords,
  leastContact,
  moduleWords,
  ratioWords,
  teethWords,
} from '../../components/optionWords';
import { formatCount, NOTHING } from '../../components/figures';
import { costInFull, costRank, stockInFull } from '../../components/supplyWords';

/** Which way a figure is better; `none` where it is a matter of choice. */
type Preference = 'less' | 'more' | 'none';

interface FigureRule {
  label: string;
  unit: string;
  prefers: Preference;
  /** What is judged; null where there is nothing to judge. */
  judged: (option: TrainOption) => number | null;
  words: (option: TrainOption) => string;
}

export interface ComparedFigure {
  label: string;
  unit: string;
  cells: { words: string; better: boolean }[];
  /** All options read the same: left out under “differences only”. */
  same: boolean;
}

const sumOf = (pick: (stage: TrainOption['stages'][number]) => number) => (option: TrainOption) =>
  option.stages.reduce((sum, stage) => sum + pick(stage), 0);

const RULES: FigureRule[] = [
  {
    label: 'Stages',
    unit: '',
    prefers: 'less',
    judged: (option) => option.stages.length,
    words: (option) => String(option.stages.length),
  },
  {
    label: 'Teeth',
    unit: '',
    prefers: 'none',
    judged: () => null,
    words: (option) => teethWords(option.stages),
  },
  {
    label: 'Module',
    unit: 'mm',
    prefers: 'none',
    judged: () => null,
    words: (option) => moduleWords(option.stages).replace(/^m /, ''),
  },
  {
    label: 'Ratio',
    unit: '',
    prefers: 'none',
    judged: () => null,
    words: (option) => ratioWords(option.ratio.value),
  },
  {
    label: 'Exact ratio',
    unit: '',
    prefers: 'none',
    judged: () => null,
    words: (option) => exactRatioWords(option.ratio),
  },
  {
    label: 'Ratio error',
    unit: '%',
    prefers: 'less',
    judged: (option) => Math.abs(option.ratio.errorPercent),
    words: (option) => errorWords(option.ratio.errorPercent),
  },
  {
    label: 'Centre-distance sum',
    unit: 'mm',
    prefers: 'less',
    judged: (option) => option.centreDistanceSum,
    words: (option) => formatNumber(option.centreDistanceSum, 2),
  },
  {
    label: 'Box, length × width × height',
    unit: 'mm',
    prefers: 'none',
    judged: () => null,
    words: (option) => boxWords(option.box),
  },
  {
    label: 'Box volume',
    unit: 'l',
    prefers: 'less',
    judged: (option) => boxVolume(option.box),
    words: (option) => formatNumber(boxVolume(option.box) / 1e6, 3),
  },
  {
    label: 'Mass of the gears',
    unit: 'kg',
    prefers: 'less',
    judged: (option) => option.mass,
    words: (option) => formatNumber(option.mass, 3),
  },
  {
    label: 'Least contact ratio',
    unit: '',
    prefers: 'more',
    judged: leastContact,
    words: (option) => formatNumber(leastContact(option), 3),
  },
  {
    label: 'Backlash at the output',
    unit: 'arcmin',
    prefers: 'less',
    judged: (option) => option.backlashArcmin,
    words: (option) => formatNumber(option.backlashArcmin, 1),
  },
  {
    label: 'Teeth to cut',
    unit: '',
    prefers: 'less',
    judged: sumOf((stage) => stage.pinionTeeth + stage.wheelTeeth),
    words: (option) => String(sumOf((stage) => stage.pinionTeeth + stage.wheelTeeth)(option)),
  },
  {
    label: 'Largest wheel',
    unit: 'mm',
    prefers: 'less',
    judged: largestWheel,
    words: (option) => formatNumber(largestWheel(option), 2),
  },
  {
    label: 'Face widths',
    unit: 'mm',
    prefers: 'none',
    judged: () => null,
    words: (option) => option.stages.map((stage) => formatTrimmed(stage.faceWidth, 2)).join(' · '),
  },
  {
    label: 'Profile shift, pinion / wheel',
    unit: '',
    prefers: 'none',
    judged: () => null,
    words: (option) =>
      option.stages
        .map((stage) => `${formatNumber(stage.pinionShift, 3)} / ${formatNumber(stage.wheelShift, 3)}`)
        .join(' · '),
  },
];

function largestWheel(option: TrainOption): number {
  return Math.max(...option.stages.map((stage) => stage.wheelTipDiameter));
}

/** Rows of cost and stock at a build quantity. */
export interface ComparedSupply {
  quantity: number;
  byOption: SupplyByOption;
}

function supplyRules({ quantity, byOption }: ComparedSupply, options: readonly TrainOption[]): FigureRule[] {
  const of = (option: TrainOption) => byOption.get(option.key);
  const read = (words: (supply: OptionSupply) => string) => (option: TrainOption) => {
    const supply = of(option);
    return supply ? words(supply) : NOTHING;
  };
  const first = options.map((option) => of(option)?.costs[0]?.currency);
  const comparable = new Set(first).size === 1;
  return [
    {
      label: `Cost of the gears for ${formatCount(quantity)}`,
      unit: '',
      prefers: 'less',
      // Only whole sums of one currency can be held against each other.
      judged: (option) => {
        const supply = of(option);
        return supply && comparable && costRank(supply) === 0 ? (supply.costs[0]?.minor ?? null) : null;
      },
      words: read(costInFull),
    },
    {
      label: 'Gears on the shelf',
      unit: '',
      prefers: 'more',
      judged: (option) => {
        const supply = of(option);
        return supply && supply.gears > 0 ? supply.onShelf / supply.gears : null;
      },
      words: read(stockInFull),
    },
    {
      label: 'Longest lead time',
      unit: 'days',
      prefers: 'less',
      judged: (option) => {
        const supply = of(option);
        return supply?.unpriced === 0 ? supply.longestLeadTimeDays : null;
      },
      words: read(({ longestLeadTimeDays }) => String(longestLeadTimeDays ?? NOTHING)),
    },
  ];
}

/**
 * The options' figures side by side. A figure is marked better only when at least two can be judged, they read
 * differently, and this one is the best of them; equal bests are all marked.
 */
export function comparedFigures(options: readonly TrainOption[], supply?: ComparedSupply): ComparedFigure[] {
  const rules = supply ? [...RULES, ...supplyRules(supply, options)] : RULES;
  return rules.map((rule) => {
    const words = options.map(rule.words);
    const judged = options.map(rule.judged);
    const best = rule.prefers === 'none' ? null : bestOf(judged, rule.prefers);
    const same = new Set(words).size <= 1;
    return {
      label: rule.label,
      unit: rule.unit,
      same,
      cells: words.map((text, index) => ({
        words: text,
        better: !same && best !== null && (judged[index] === best || text === words[judged.indexOf(best)]),
      })),
    };
  });
}

function bestOf(values: readonly (number | null)[], prefers: 'less' | 'more'): number | null {
  const known = values.filter((value): value is number => value !== null && Number.isFinite(value));
  if (known.length < 2) return null;
  return prefers === 'less' ? Math.min(...known) : Math.max(...known);
}
