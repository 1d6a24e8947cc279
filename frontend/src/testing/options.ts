import type { TrainOption } from '../api/types';

type Changes = Partial<Omit<TrainOption, 'ratio' | 'stages'>> & {
  errorPercent?: number;
  contactRatio?: number;
};

/** An option for tests: `optionOf([[18, 110], [19, 116]])`. Figures that nobody gave are plain round ones. */
export function optionOf(pairs: [pinion: number, wheel: number][], changes: Changes = {}): TrainOption {
  const { errorPercent = 0, contactRatio = 1.6, ...rest } = changes;
  const value = pairs.reduce((product, [pinion, wheel]) => (product * wheel) / pinion, 1);
  return {
    key: pairs.map(([pinion, wheel]) => `${pinion}/${wheel}m1`).join('+'),
    stages: pairs.map(([pinionTeeth, wheelTeeth]) => ({
      pinionTeeth,
      wheelTeeth,
      module: 1,
      faceWidth: 10,
      pinionShift: 0,
      wheelShift: 0,
      pinionTipDiameter: pinionTeeth + 2,
      wheelTipDiameter: wheelTeeth + 2,
      centreDistance: (pinionTeeth + wheelTeeth) / 2,
      contactRatio,
      contactRatioWorst: null,
    })),
    ratio: { numerator: '75', denominator: '2', value, errorPercent },
    centreDistanceSum: pairs.reduce((sum, [pinion, wheel]) => sum + (pinion + wheel) / 2, 0),
    mass: 1,
    box: { length: 150, width: 40, height: 100 },
    backlashArcmin: 10,
    lossPercent: null,
    cost: null,
    newParts: null,
    ...rest,
  };
}
