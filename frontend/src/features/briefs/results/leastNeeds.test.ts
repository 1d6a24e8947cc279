import { expect, it } from 'vitest';
import { requirement } from '../../../testing/briefs';
import { leastNeeds } from './leastNeeds';

const tensioner = {
  ...requirement,
  ratio: { target: '150', tolerancePercent: '1' },
  teeth: { pinion: { min: 17, max: 30 }, wheel: { min: 20, max: 120 } },
  envelope: { length: 90, width: 60, height: 60, wall: 4 },
};

it('says what one stage needs at the very least', () => {
  // 150 less 1 % is 148.5; 17 times that is 2524.5 teeth, and (17 + 2524.5)/2 mm is 1270.75 mm.
  expect(leastNeeds(1, tensioner)).toEqual([
    'With a pinion of 17 teeth the largest wheel needs at least 2,525; the brief allows 120.',
    'One stage of m 1 puts the input and output axes at least 1,270 mm apart; the box is 90 mm long.',
  ]);
});

it('names the box alone where the teeth would do', () => {
  // The cube root of 148.5 is 5.2956: wheels of 91 teeth, and three times 17 times 6.2956 halves is 160.5 mm.
  expect(leastNeeds(3, tensioner)).toEqual([
    'Three stages of m 1 put the input and output axes at least 160 mm apart; the box is 90 mm long.',
  ]);
});

it('says nothing where the simple bound is met', () => {
  expect(leastNeeds(2, requirement)).toEqual([]);
});
