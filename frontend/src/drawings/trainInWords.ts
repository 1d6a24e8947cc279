import type { TrainOption, TrainSpec } from '@stageyard/libs/train-planner';

const COUNT = ['No', 'One', 'Two', 'Three', 'Four'];

/** "Two stages, 18/110 and 19/116 teeth": what the drawing says to someone who cannot see it. */
export function trainInWords(train: TrainOption | TrainSpec): string {
  const pairs = train.stages.map((stage) =>
    'pinionTeeth' in stage
      ? `${stage.pinionTeeth}/${stage.wheelTeeth}`
      : `${stage.pinion.teeth}/${stage.wheel.teeth}`,
  );
  const count = COUNT[pairs.length] ?? String(pairs.length);
  const last = pairs.pop();
  const listed = pairs.length === 0 ? last : `${pairs.join(', ')} and ${last}`;
  return `${count} ${pairs.length === 0 ? 'stage' : 'stages'}, ${listed} teeth, seen along the shafts, to scale`;
}
