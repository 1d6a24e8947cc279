import { type Random } from '../data/random.js';
import { type ScalePart } from './scale-part.js';

const STEEL = 7850;
const cylinder = (diameter: number, length: number): number => (Math.PI / 4) * diameter ** 2 * length * 1e-9;
/** To three digits, as a data sheet would print it; at least a tenth of a gram. */
const rounded = (kilograms: number): number => Math.max(0.0001, Number(kilograms.toPrecision(3)));
const DIAMETERS = [4, 5, 6, 8, 10, 12, 15, 17, 20, 25, 30, 35, 40, 45, 50, 60];

type Maker = (random: Random, mark: string) => ScalePart;

const bearing: Maker = (random, mark) => {
  const bore = random.pick(DIAMETERS);
  const outerDiameter = Math.round(bore * random.pick([1.6, 1.9, 2.2])) + 6;
  const width = Math.max(4, Math.round((outerDiameter - bore) * 0.6));
  return {
    kind: 'bearing',
    description: `Deep-groove ball bearing ${bore} × ${outerDiameter} × ${width} mm, make ${mark}`,
    material: 'bearing steel',
    mass: rounded((cylinder(outerDiameter, width) - cylinder(bore, width)) * STEEL * 0.6),
    attributes: { bore, outerDiameter, width, type: 'deep-groove ball' },
  };
};

const key: Maker = (random, mark) => {
  const width = random.pick([2, 3, 4, 5, 6, 8, 10, 12, 14]);
  const height = width <= 6 ? width : width - 1;
  const length = random.whole(2, 16) * width;
  return {
    kind: 'key',
    description: `Parallel key ${width} × ${height} × ${length} mm, make ${mark}`,
    material: 'C45',
    mass: rounded(width * height * length * 1e-9 * STEEL),
    attributes: { width, height, length },
  };
};

const ring: Maker = (random, mark) => {
  const shaftDiameter = random.pick(DIAMETERS);
  const thickness = shaftDiameter < 20 ? 1 : 1.5;
  return {
    kind: 'retaining-ring',
    description: `Retaining ring for a ${shaftDiameter} mm shaft, make ${mark}`,
    material: 'spring steel',
    mass: rounded(cylinder(shaftDiameter * 1.25, thickness) * STEEL * 0.4),
    attributes: { shaftDiameter, thickness, grooveDiameter: Number((shaftDiameter * 0.95).toFixed(2)) },
  };
};

const seal: Maker = (random, mark) => {
  const shaftDiameter = random.pick(DIAMETERS);
  const outerDiameter = shaftDiameter + random.pick([10, 12, 15, 20]);
  return {
    kind: 'seal',
    description: `Rotary shaft seal ${shaftDiameter} × ${outerDiameter} × 7 mm, make ${mark}`,
    material: random.pick(['NBR', 'FKM']),
    mass: rounded(cylinder(outerDiameter, 7) * 1300 * 0.5),
    attributes: { shaftDiameter, outerDiameter, width: 7 },
  };
};

const shaft: Maker = (random, mark) => {
  const diameter = random.pick(DIAMETERS);
  const length = random.whole(8, 60) * 10;
  return {
    kind: 'shaft',
    description: `Ground shaft ${diameter} h6 × ${length} mm, make ${mark}`,
    material: 'C45',
    mass: rounded(cylinder(diameter, length) * STEEL),
    attributes: { diameter, length },
  };
};

const housing: Maker = (random, mark) => {
  const [length, width, height] = [
    random.whole(10, 60) * 10,
    random.whole(6, 30) * 10,
    random.whole(8, 40) * 10,
  ];
  const wall = random.pick([5, 6, 8, 10]);
  return {
    kind: 'housing',
    description: `Cast housing ${length} × ${width} × ${height} mm, make ${mark}`,
    material: 'EN AC-AlSi10Mg',
    mass: rounded(2 * (length * width + width * height + length * height) * wall * 1e-9 * 2680),
    attributes: { length, width, height, wall },
  };
};

const fastener: Maker = (random, mark) => {
  const diameter = random.pick([3, 4, 5, 6, 8, 10, 12]);
  const length = random.whole(2, 20) * 5;
  const strengthClass = random.pick(['8.8', '10.9', '12.9']);
  return {
    kind: 'fastener',
    description: `Hexagon socket head screw M${diameter} × ${length}, ${strengthClass}, make ${mark}`,
    material: 'steel',
    mass: rounded((cylinder(diameter, length) + cylinder(diameter * 1.6, diameter)) * STEEL),
    attributes: { thread: `M${diameter}`, length, strengthClass },
  };
};

const lubricant: Maker = (random, mark) => {
  const viscosityGrade = `ISO VG ${random.pick([68, 100, 150, 220, 320, 460])}`;
  const packVolume = random.pick([1, 5, 20]);
  return {
    kind: 'lubricant',
    description: `Gear oil ${viscosityGrade}, ${packVolume} l can, make ${mark}`,
    material: 'mineral oil',
    mass: 0.89,
    attributes: { viscosityGrade, packVolume },
  };
};

/** Screws and bearings are more of a library than housings. */
const MAKERS = [
  bearing,
  bearing,
  bearing,
  key,
  key,
  ring,
  ring,
  seal,
  seal,
  shaft,
  shaft,
  fastener,
  fastener,
  fastener,
  housing,
  lubricant,
];

/** Any part that has no teeth. */
export function scaleOther(random: Random, mark: string): ScalePart {
  return random.pick(MAKERS)(random, mark);
}
