import useSWR from 'swr';
import { answer, api } from '../client';
import type { PartPage, TrainSpec } from '../types';

type PartSummary = PartPage['items'][number];

/** The data a stock gear must agree in to take a place in a train. */
export interface GearPlace {
  teeth: number;
  module: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
  profileShift: number;
  faceWidth: number;
  hand?: 'left' | 'right';
}

/** The place of one gear of a train. */
export function gearPlace(spec: TrainSpec, stage: number, role: 'pinion' | 'wheel'): GearPlace | null {
  const found = spec.stages[stage];
  if (!found) return null;
  const { teeth, profileShift, faceWidth, hand } = found[role];
  return {
    teeth,
    profileShift,
    faceWidth,
    hand,
    module: found.module,
    pressureAngleDeg: spec.pressureAngleDeg,
    helixAngleDeg: spec.helixAngleDeg,
  };
}

/** Shifts closer than this are the same gear, modules. */
const SAME_SHIFT = 1e-6;

/** Cleared gears of the library that can take a place; a shift the library does not know counts as 0. */
export function useFittingGears(place: GearPlace | null) {
  return useSWR<PartSummary[], unknown>(
    place === null ? null : ['/api/parts', 'fitting', place],
    async () => {
      const { teeth, module, pressureAngleDeg, helixAngleDeg, hand, faceWidth, profileShift } =
        place as GearPlace;
      const query = {
        kind: 'gear' as const,
        standing: 'cleared' as const,
        teethMin: teeth,
        teethMax: teeth,
        module,
        pressureAngleDeg,
        helixAngleDeg,
        faceWidthMin: faceWidth,
        size: 100,
        sort: 'faceWidth,number',
        ...(helixAngleDeg > 0 && hand ? { hand } : {}),
      };
      const page = await answer(api.GET('/api/parts', { params: { query } }));
      return page.items.filter(({ attributes }) => {
        const shift = 'profileShift' in attributes ? Number(attributes.profileShift ?? 0) : 0;
        return Math.abs(shift - profileShift) < SAME_SHIFT;
      });
    },
  );
}
