import { compareRatios, InputError, toRatio } from '../units/index.js';
import { FieldReader, isGiven } from './field-reader.js';
import { type CheckedRequest, type Envelope } from './option-request.js';

/** Bounds of what the planner accepts. A wheel may be large so that "why not" can name it and be asked again. */
export const REQUEST_BOUNDS = {
  target: [0.001, 100_000],
  tolerancePercent: [0, 50],
  stages: [1, 3],
  teeth: [4, 1000],
  module: [0.05, 100],
  mostModules: 30,
  faceWidthFactor: [1, 100],
  leastContactRatio: [0, 5],
  centreDistanceAllowance: [0, 2],
  helixAngleDeg: [0, 45],
  stageRatio: [0.001, 1000],
  envelopeSide: [0.1, 100_000],
  wall: [0, 1000],
  limit: [1, 500],
} as const;

const PRESSURE_ANGLES = [14.5, 15, 17.5, 20, 22.5, 25] as const;

/**
 * Checks a request field by field and fills in the defaults.
 * @throws InputError listing every field at fault, with its value, its limit and what to do
 */
export function validateOptionRequest(input: unknown): CheckedRequest {
  const read = new FieldReader();
  const request = read.object(input, 'request');
  const ratio = read.object(request.ratio, 'ratio');
  const teeth = read.object(request.teeth, 'teeth');
  const bounds = REQUEST_BOUNDS;
  const checked: CheckedRequest = {
    ratio: {
      target: read.decimal(ratio.target, 'ratio.target', 'The ratio', bounds.target),
      tolerancePercent: read.decimal(
        ratio.tolerancePercent,
        'ratio.tolerancePercent',
        'The ratio tolerance in per cent',
        bounds.tolerancePercent,
      ),
    },
    stages: read.range(request.stages, 'stages', 'number of stages', bounds.stages),
    teeth: {
      pinion: read.range(teeth.pinion, 'teeth.pinion', 'number of pinion teeth', bounds.teeth),
      wheel: read.range(teeth.wheel, 'teeth.wheel', 'number of wheel teeth', bounds.teeth),
    },
    modules: readModules(read, request.modules),
    pressureAngleDeg: read.choice(
      request.pressureAngleDeg,
      'pressureAngleDeg',
      'The pressure angle in degrees',
      PRESSURE_ANGLES,
      20,
    ),
    helixAngleDeg: read.number(
      request.helixAngleDeg,
      'helixAngleDeg',
      'The helix angle in degrees',
      bounds.helixAngleDeg,
      0,
    ),
    faceWidthFactor: read.number(
      request.faceWidthFactor,
      'faceWidthFactor',
      'The face width in modules',
      bounds.faceWidthFactor,
      10,
    ),
    shiftPolicy: read.choice(
      request.shiftPolicy,
      'shiftPolicy',
      'The shift policy',
      ['none', 'clear-undercut'],
      'none',
    ),
    leastContactRatio: read.number(
      request.leastContactRatio,
      'leastContactRatio',
      'The least contact ratio',
      bounds.leastContactRatio,
      1.2,
    ),
    centreDistanceAllowance: read.number(
      request.centreDistanceAllowance,
      'centreDistanceAllowance',
      'The centre-distance allowance in modules',
      bounds.centreDistanceAllowance,
      0,
    ),
    undercut: read.choice(request.undercut, 'undercut', 'Undercut', ['allow', 'refuse'], 'allow'),
    stageRatio: readStageRatio(read, request.stageRatio),
    arrangement: read.choice(request.arrangement, 'arrangement', 'The arrangement', ['in-line'], 'in-line'),
    direction: read.choice(
      request.direction,
      'direction',
      'The direction of rotation',
      ['same', 'opposite', 'any'],
      'any',
    ),
    source: read.choice(request.source, 'source', 'The source of gears', ['any'], 'any'),
    objective: read.choice(request.objective, 'objective', 'The objective', [
      'centre-distance',
      'ratio-error',
      'mass',
    ]),
    limit: read.whole(request.limit, 'limit', 'The number of options', bounds.limit, 50),
    bestOf: read.choice(request.bestOf, 'bestOf', 'Best of', ['all', 'each-count'], 'all'),
  };
  const envelope = readEnvelope(read, request.envelope);
  if (envelope) checked.envelope = envelope;
  read.absent(
    request.load,
    'load',
    'A load is not rated yet. Leave it out; the search then sizes by geometry alone.',
  );
  read.absent(
    request.centreDistanceGrade,
    'centreDistanceGrade',
    'A tolerance grade of the centre distance is not searched yet. Leave it out and give an allowance instead.',
  );
  if (read.issues.length > 0) throw new InputError(read.issues);
  return checked;
}

function readModules(read: FieldReader, value: unknown): number[] {
  const { module, mostModules } = REQUEST_BOUNDS;
  if (!Array.isArray(value) || value.length === 0) {
    read.refuse('modules', value, 'No module is given. List at least one, in mm.', 1);
    return [];
  }
  if (value.length > mostModules) {
    const message = `The list has ${value.length} modules. Give at most ${mostModules}.`;
    read.refuse('modules', value, message, mostModules);
    return [];
  }
  return value.map((one: unknown, index) => read.number(one, `modules.${index}`, 'A module in mm', module));
}

function readStageRatio(read: FieldReader, value: unknown): CheckedRequest['stageRatio'] {
  const { min, max } = read.object(value, 'stageRatio');
  const bounds = REQUEST_BOUNDS.stageRatio;
  const found = read.issues.length;
  const least = isGiven(min) ? read.decimal(min, 'stageRatio.min', 'The least stage ratio', bounds) : 1;
  if (!isGiven(max)) return { min: least };
  const most = read.decimal(max, 'stageRatio.max', 'The greatest stage ratio', bounds);
  if (read.issues.length === found && compareRatios(toRatio(least), toRatio(most)) > 0) {
    const message = `The greatest stage ratio is ${most}, below the least, ${least}. Raise it or lower the least.`;
    read.refuse('stageRatio.max', most, message, least);
  }
  return { min: least, max: most };
}

function readEnvelope(read: FieldReader, value: unknown): Envelope | undefined {
  if (!isGiven(value)) return undefined;
  const given = read.object(value, 'envelope');
  const envelope: Envelope = {};
  for (const side of ['length', 'width', 'height'] as const) {
    if (!isGiven(given[side])) continue;
    const words = `The ${side} of the envelope in mm`;
    envelope[side] = read.number(given[side], `envelope.${side}`, words, REQUEST_BOUNDS.envelopeSide);
  }
  if (Object.keys(envelope).length === 0) return undefined;
  const wall = read.number(given.wall, 'envelope.wall', 'The wall in mm', REQUEST_BOUNDS.wall, 0);
  return { ...envelope, wall };
}
