import { formatTrimmed } from '../units/index.js';
import { type KitItem } from './bom-line.js';
import { FLAG } from './flags.js';
import { type KitBox, type KitRequest } from './kit.js';
import { type PartFinder } from './part-finder.js';
import { kitItem } from './part-lines.js';

const ALUMINIUM_DENSITY = 2700;

/** The housing and its oil. */
export function boxItems(request: KitRequest, library: PartFinder): KitItem[] {
  return [housingItem(request.box, library), lubricantItem(request, library)];
}

function housingItem(box: KitBox, library: PartFinder): KitItem {
  const { length, width, height, wall } = box;
  const sizes = [length, width, height].map((size) => formatTrimmed(size, 1)).join(' × ');
  const need = { kind: 'housing' as const, length, width, height, wall };
  const part = library.find(need);
  const density = box.density ?? ALUMINIUM_DENSITY;
  const estimated = !part || part.mass === null;
  return kitItem(
    {
      kind: 'housing',
      description: `Housing ${sizes} mm, wall ${formatTrimmed(wall, 2)} mm`,
      quantity: 1,
      material: box.material ?? 'aluminium',
      supply: 'made',
      mass: (length * width * height - insideVolume(box)) * density * 1e-9,
      source: 'Housing',
      note: estimated ? `Mass as a closed box of ${density.toLocaleString('en-GB')} kg/m³.` : '',
      flags: estimated ? [FLAG.massEstimated] : [],
      need,
    },
    part,
  );
}

/** A third of the inside, rounded up to 0.1 l: a first figure for splash lubrication, to be settled on the drawing. */
function lubricantItem(request: KitRequest, library: PartFinder): KitItem {
  const viscosityGrade = request.viscosityGrade ?? 'ISO VG 220';
  const need = { kind: 'lubricant' as const, viscosityGrade };
  const part = library.find(need);
  const pack = part?.packVolume ?? null;
  const perLitre = part && part.mass !== null && pack ? { ...part, mass: part.mass / pack } : null;
  const packNote = pack ? ` Packs of ${formatTrimmed(pack, 2)} l.` : '';
  return kitItem(
    {
      kind: 'lubricant',
      description: `Gear oil ${viscosityGrade}`,
      quantity: Math.max(1, Math.ceil((insideVolume(request.box) / 3) * 1e-6 * 10 - 1e-9)) / 10,
      unit: 'l',
      material: null,
      supply: 'bought',
      mass: null,
      source: 'Housing',
      note: `A third of the inside of the housing.${packNote}`,
      flags: [FLAG.quantityEstimated],
      need,
    },
    perLitre ?? (part && { ...part, mass: null }),
  );
}

/** mm³ */
function insideVolume({ length, width, height, wall }: KitBox): number {
  return (length - 2 * wall) * (width - 2 * wall) * (height - 2 * wall);
}
