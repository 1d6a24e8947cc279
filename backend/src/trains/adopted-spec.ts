import { type SpecGear, type SpecStage, type TrainSpec } from '@stageyard/libs/train-planner';

/** A gear of an adopted train: its data, and the stock part that is it, or null when it is made to order. */
export interface AdoptedGear extends SpecGear {
  partNumber: string | null;
}

export interface AdoptedStage extends SpecStage {
  pinion: AdoptedGear;
  wheel: AdoptedGear;
}

/**
 * Where a shaft's diameter comes from: its torque (raised to the next bearing bore), a stock gear's bore, the house's
 * starting figure, or a person.
 */
export const DIAMETER_BASES = ['torque', 'bore', 'start', 'typed'] as const;
export type DiameterBasis = (typeof DIAMETER_BASES)[number];

export interface AdoptedShaft {
  /** mm */
  diameter: number;
  basis: DiameterBasis;
}

/** What is kept of a train: the planner's specification, the chosen parts and the shafts. */
export interface AdoptedSpec extends TrainSpec {
  stages: AdoptedStage[];
  /** Shaft 0 is the input; one more than there are stages. */
  shafts: AdoptedShaft[];
}

/** Which gear of a train is meant. */
export interface GearPlace {
  /** 0 for the first stage. */
  stage: number;
  role: 'pinion' | 'wheel';
}

/** A gear with where it sits and its stage's module, mm. */
export interface PlacedGear extends GearPlace {
  gear: AdoptedGear;
  module: number;
}

/** `Stage 1 pinion`, as people count. */
export function placeName({ stage, role }: GearPlace): string {
  return `Stage ${stage + 1} ${role}`;
}

/** Every gear in order: stage by stage, pinion before wheel. */
export function gearsOf(spec: Pick<AdoptedSpec, 'stages'>): PlacedGear[] {
  return spec.stages.flatMap((stage, index) => [
    { stage: index, role: 'pinion' as const, gear: stage.pinion, module: stage.module },
    { stage: index, role: 'wheel' as const, gear: stage.wheel, module: stage.module },
  ]);
}

/** The gears on one shaft: the wheel of the stage before it and the pinion of the stage after it. */
export function gearsOnShaft(spec: Pick<AdoptedSpec, 'stages'>, shaft: number): PlacedGear[] {
  return gearsOf(spec).filter(({ stage, role }) => (role === 'pinion' ? stage : stage + 1) === shaft);
}
