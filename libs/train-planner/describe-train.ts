import { meshGeometry, type GearInput, type MeshGeometry } from '../gear-geometry/index.js';
import { InputError, multiply, ratio, ratioErrorPercent, ratioToNumber } from '../units/index.js';
import { checkTrain } from './check-train.js';
import { outputBacklash } from './output-backlash.js';
import { DEFAULT_DENSITY } from './stage-pairs.js';
import { DEFAULT_GAP, lengthInLine, toNm, widthOfPlanes } from './train-box.js';
import { trainChecks } from './train-checks.js';
import { outputDirection } from './train-search.js';
import { trainShafts } from './train-shafts.js';
import { type Box } from './train-option.js';
import { type SpecGear, type SpecStage, type TrainFigures, type TrainSpec } from './train-spec.js';

/**
 * Every figure of a whole train: meshes at their operating distances, shafts, box, and each requirement held
 * against it. Masses are those of solid discs at the reference diameter.
 * @throws InputError naming the field (`stages.0.pinion.teeth`) when a stage or a figure has no meaning
 */
export function describeTrain(train: TrainSpec): TrainFigures {
  checkTrain(train);
  const meshes = train.stages.map((stage, index) => stageMesh(train, stage, index));
  const exact = multiply(...train.stages.map(({ pinion, wheel }) => ratio(wheel.teeth, pinion.teeth)));
  const box = trainBox(train, meshes);
  return {
    ratio: {
      numerator: exact.numerator.toString(),
      denominator: exact.denominator.toString(),
      value: ratioToNumber(exact),
      errorPercent: train.target ? ratioErrorPercent(exact, train.target.ratio) : null,
    },
    centreDistanceSum: toNm(meshes.reduce((sum, mesh) => sum + mesh.centreDistance, 0)) / 1e6,
    mass:
      Math.round(meshes.reduce((sum, mesh, index) => sum + stageMass(train.stages[index], mesh), 0)) / 1e6,
    box,
    backlashArcmin: outputBacklash(meshes),
    direction: outputDirection(train.stages.length),
    shafts: trainShafts(
      train,
      meshes.map((mesh) => mesh.ratio),
    ),
    meshes,
    findings: meshes.flatMap((mesh, stage) => mesh.findings.map((finding) => ({ ...finding, stage }))),
    checks: trainChecks(train, exact, meshes, box),
  };
}

/** The mesh of one stage; refusals name the stage's field. */
function stageMesh(train: TrainSpec, stage: SpecStage, index: number): MeshGeometry {
  try {
    return meshGeometry({
      pinion: gearInput(train, stage, stage.pinion),
      wheel: gearInput(train, stage, stage.wheel),
      centreDistance: stage.centreDistance,
      leastContactRatio: train.leastContactRatio,
    });
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(
      error.errors.map((issue) => ({
        ...issue,
        field: `stages.${index}.${issue.field}`,
        message: `Stage ${index + 1}: ${issue.message}`,
      })),
    );
  }
}

function gearInput(train: TrainSpec, stage: SpecStage, gear: SpecGear): GearInput {
  const input: GearInput = {
    teeth: gear.teeth,
    module: stage.module,
    pressureAngleDeg: train.pressureAngleDeg,
    helixAngleDeg: train.helixAngleDeg,
    profileShift: gear.profileShift,
    faceWidth: gear.faceWidth,
  };
  if (gear.hand) input.hand = gear.hand;
  return input;
}

/** mg, both gears as solid discs at the reference diameter. */
function stageMass(stage: SpecStage | undefined, mesh: MeshGeometry): number {
  if (!stage) return 0;
  const disc = (gear: SpecGear, diameter: number) =>
    Math.PI * (diameter / 2) ** 2 * gear.faceWidth * (gear.density ?? DEFAULT_DENSITY) * 1e-3;
  return (
    disc(stage.pinion, mesh.gear.pinion.referenceDiameter) +
    disc(stage.wheel, mesh.gear.wheel.referenceDiameter)
  );
}

function trainBox(train: TrainSpec, meshes: readonly MeshGeometry[]): Box {
  const walls = toNm(2 * (train.envelope?.wall ?? 0));
  const outer = (mm: number) => (toNm(mm) + walls) / 1e6;
  const stages = meshes.map(({ centreDistance, gear }) => ({
    centreDistance,
    pinionTip: gear.pinion.tipDiameter / 2,
    wheelTip: gear.wheel.tipDiameter / 2,
  }));
  const planes = train.stages.map(({ pinion, wheel }) => Math.max(pinion.faceWidth, wheel.faceWidth));
  return {
    length: outer(lengthInLine(stages)),
    width: outer(widthOfPlanes(planes, train.gap ?? DEFAULT_GAP)),
    height: outer(2 * Math.max(...stages.map(({ pinionTip, wheelTip }) => Math.max(pinionTip, wheelTip)))),
  };
}
