import { describe, expect, it } from 'vitest';
import { newTrain } from '../../testing/trains';
import { trainDifferences } from './trainDifferences';

describe('what somebody else changed on a train', () => {
  it('names quantity, gears and offers, and nothing that stayed', () => {
    const before = newTrain({ buildQuantity: 10, offerChoices: [{ partNumber: 'BR-1', offerId: '4' }] });
    const after = newTrain({ buildQuantity: 25, offerChoices: [{ partNumber: 'BR-2', offerId: '9' }] });
    const [stage] = after.spec.stages;
    if (stage) stage.wheel = { ...stage.wheel, partNumber: 'KW-00099' };
    expect(trainDifferences(before, after)).toEqual([
      'build quantity 10 → 25',
      'stage 1 wheel to be made → KW-00099',
      'offer for BR-1',
      'offer for BR-2',
    ]);
    expect(trainDifferences(before, before)).toEqual([]);
  });
});
