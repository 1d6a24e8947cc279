import { expect, it } from 'vitest';
import { optionOf } from '../../testing/options';
import { fewerAgainstMore } from './sentences';

const two = optionOf(
  [
    [18, 110],
    [19, 116],
  ],
  { mass: 1.24, backlashArcmin: 11, contactRatio: 1.578 },
);
const three = optionOf(
  [
    [17, 57],
    [18, 58],
    [18, 62],
  ],
  { mass: 0.84, backlashArcmin: 17, contactRatio: 1.528 },
);

it('weighs three stages against two in plain words', () => {
  const [sentence] = fewerAgainstMore([three, two]);
  // 263/2 = 131.5 mm against 230/2 = 115 mm
  expect(sentence).toBe(
    'Three stages (17/57 · 18/58 · 18/62) instead of two stages (18/110 · 19/116) means 16.5 mm of centre distance less, ' +
      '0.40 kg of gears less and 6.0′ of backlash more, for 1 more shaft, 2 more bearings and 2 more gears; ' +
      'its least contact ratio is 0.050 lower.',
  );
});

it('says first why one stage is out', () => {
  const whyNot = [
    { stages: 1, limit: 'teeth.wheel.max', message: 'One stage needs a wheel of 669 teeth.', nearest: 669 },
  ];
  expect(fewerAgainstMore([three, two], whyNot)[0]).toBe('One stage needs a wheel of 669 teeth.');
});

it('has nothing to weigh when all have the same count, and says what to pin', () => {
  expect(fewerAgainstMore([two, two])).toEqual([
    'All shown have two stages; pin an option with another count to weigh one against the other.',
  ]);
  expect(fewerAgainstMore([])).toEqual([]);
});
