import {
  gearRadii,
  HOUSE_LIMITS,
  meshInterferes,
  meshKernel,
  zeroBacklashDistance,
  type GearFigures,
} from '../gear-geometry/index.js';
import { leastClearShift } from '../gear-geometry/shift.js';
import { degToRad } from '../units/index.js';
import { type CheckedRequest } from './option-request.js';
import { PairPoolBuilder, type PairPool } from './pair-pool.js';
import { compareFraction } from './ratio-window.js';
import { type ExactLimit, type StageLimits } from './stage-limits.js';
import { toNm } from './train-box.js';
import { type WorkWatch } from './work-watch.js';

/** kg/m³, solid steel discs: without a material every gear counts as steel. */
export const DEFAULT_DENSITY = 7850;

const ANY_RATIO = { least: 0, greatest: Infinity };

/** One gear of the request's module and shift policy. */
export interface StageGear extends GearFigures {
  shift: number;
  tipDiameterNm: number;
  /** mg, a solid disc at the reference diameter. */
  discMass: number;
}

/** Makes the pairs a request allows as stages. Gears and the dear interference checks are kept between calls. */
export class StagePairs {
  readonly module: number;
  /** Whole mm. */
  readonly faceWidth: number;
  readonly #request: CheckedRequest;
  readonly #watch: WorkWatch;
  readonly #gears = new Map<number, StageGear | null>();
  readonly #interference = new Map<number, boolean>();

  constructor(request: CheckedRequest, watch: WorkWatch) {
    this.#request = request;
    this.#watch = watch;
    this.module = Math.min(...request.modules);
    // The product of two decimals carries float noise: 10 × 1.1 is 11, not the next whole number.
    this.faceWidth = Math.ceil(request.faceWidthFactor * this.module - 1e-9);
  }

  /** The gear, or null when its tip is pointed or thinner than the house allows. */
  gear(teeth: number): StageGear | null {
    let gear = this.#gears.get(teeth);
    if (gear === undefined) {
      gear = this.#makeGear(teeth);
      this.#gears.set(teeth, gear);
    }
    return gear;
  }

  /**
   * Every pair within the limits with sound tips and roots. Whether its flanks interfere is left to `interferes`.
   * @param band ratios wanted; it only saves work
   */
  within(limits: StageLimits, { least, greatest } = ANY_RATIO): PairPool {
    const builder = new PairPoolBuilder();
    const step = () => this.#watch.step();
    if (least > greatest) return builder.build(step);
    const wheels = this.#gearsWithin(limits.wheel, limits);
    for (const pinion of this.#gearsWithin(limits.pinion, limits)) {
      for (const wheel of wheels) {
        const ratio = wheel.teeth / pinion.teeth;
        if (ratio < least || ratio > greatest) continue;
        step();
        this.#addPair(pinion, wheel, limits, builder);
      }
    }
    return builder.build(step);
  }

  #gearsWithin({ min, max }: { min: number; max: number }, limits: StageLimits): StageGear[] {
    const gears: StageGear[] = [];
    for (let teeth = min; teeth <= max; teeth++) {
      const gear = this.gear(teeth);
      if (!gear || (gear.undercut && limits.refuseUndercut)) continue;
      if (gear.tipDiameterNm <= limits.greatestTipDiameter) gears.push(gear);
    }
    return gears;
  }

  #addPair(pinion: StageGear, wheel: StageGear, limits: StageLimits, builder: PairPoolBuilder): void {
    if (!ratioWithin(wheel.teeth, pinion.teeth, limits)) return;
    const centreDistance = this.#distance(pinion, wheel);
    if (!(centreDistance > pinion.base + wheel.base)) return;
    const contactRatio = meshKernel(pinion, wheel, centreDistance, pinion.basePitch);
    if (contactRatio < limits.leastContactRatio) return;
    if (tipHitsRoot(pinion, wheel, centreDistance) || tipHitsRoot(wheel, pinion, centreDistance)) return;
    builder.add({
      pinion: pinion.teeth,
      wheel: wheel.teeth,
      ratio: wheel.teeth / pinion.teeth,
      centreDistance,
      distance: centreDistance * 1e6,
      mass: pinion.discMass + wheel.discMass,
      pinionTip: pinion.tip,
      wheelTip: wheel.tip,
      contactRatio,
    });
  }

  /** Operating distance: without backlash, plus the allowance. */
  #distance(pinion: StageGear, wheel: StageGear): number {
    const { pressureAngleDeg, helixAngleDeg, centreDistanceAllowance } = this.#request;
    const zeroBacklash = zeroBacklashDistance(
      pinion.teeth,
      wheel.teeth,
      pinion.shift,
      wheel.shift,
      this.module,
      degToRad(pressureAngleDeg),
      degToRad(helixAngleDeg),
    );
    return zeroBacklash + centreDistanceAllowance * this.module;
  }

  /**
   * Whether the flanks of a pair of `within` interfere. Dear where teeth are undercut, and rare, so a search asks
   * only about pairs of trains that it would otherwise take.
   */
  interferes(pinionTeeth: number, wheelTeeth: number): boolean {
    const key = pinionTeeth * 65536 + wheelTeeth;
    let verdict = this.#interference.get(key);
    if (verdict === undefined) {
      const pinion = this.gear(pinionTeeth);
      const wheel = this.gear(wheelTeeth);
      verdict = !pinion || !wheel || meshInterferes(pinion, wheel, this.#distance(pinion, wheel));
      this.#interference.set(key, verdict);
    }
    return verdict;
  }

  #makeGear(teeth: number): StageGear | null {
    const { pressureAngleDeg, helixAngleDeg, shiftPolicy } = this.#request;
    const input = { teeth, module: this.module, pressureAngleDeg, helixAngleDeg };
    let figures = gearRadii(input);
    let shift = 0;
    if (shiftPolicy === 'clear-undercut' && figures.leastShift > 0) {
      shift = leastClearShift(input);
      figures = gearRadii({ ...input, profileShift: shift });
    }
    if (figures.tipThickness < HOUSE_LIMITS.tipThickness * this.module) return null;
    const discVolume = Math.PI * figures.reference ** 2 * this.faceWidth;
    // 1 kg/m³ is 1e-3 mg/mm³.
    const discMass = discVolume * DEFAULT_DENSITY * 1e-3;
    return { ...figures, shift, tipDiameterNm: toNm(2 * figures.tip), discMass };
  }
}

/** Teeth that run into the mate's root cannot turn, wherever their flanks would touch. */
function tipHitsRoot(gear: StageGear, mate: StageGear, centreDistance: number): boolean {
  return centreDistance - gear.tip - mate.root < -1e-9 * gear.module;
}

function ratioWithin(wheel: number, pinion: number, { ratioMin, ratioMax }: StageLimits): boolean {
  if (compareStageRatio(wheel, pinion, ratioMin) < 0) return false;
  return ratioMax === null || compareStageRatio(wheel, pinion, ratioMax) <= 0;
}

/** Sign of wheel/pinion − limit: by floats where they are clear, else exact. */
function compareStageRatio(wheel: number, pinion: number, limit: ExactLimit): number {
  const apart = wheel / pinion - limit.value;
  return Math.abs(apart) > 1e-9 ? apart : compareFraction(wheel, pinion, limit.exact);
}
