import { type FitNotes, figure, plain } from './fit-notes.js';
import { type RatedStrength, type SubstitutePart, type SubstituteTeeth } from './substitute-part.js';

type Toothed = SubstitutePart & { sizes: SubstituteTeeth };

/**
 * The material must be at least as strong: both allowable stress numbers, σ_Hlim and σ_Flim, at least the original's.
 * What the table does not rate drops in only as the very same material; any other is to be checked, but plastic or brass
 * never takes the place of rated steel or iron.
 */
export function compareStrength(original: Toothed, candidate: Toothed, notes: FitNotes): void {
  const [wanted, has] = [original.sizes.strength, candidate.sizes.strength];
  if (wanted && has) return compareRated(wanted, has, candidate, notes);
  // One rated and the other not, though of one name: its hardness is outside what the table covers.
  if (!wanted && !has && sameMaterial(original, candidate)) return;
  const [held, needed] = [made(candidate), made(original)];
  if (wanted && candidate.sizes.softerThanSteel) {
    return notes.misfit(`material ${held} is weaker than ${needed}`);
  }
  notes.check(
    original.material === null
      ? `material ${held}: the original’s is not known`
      : `material ${held} in place of ${needed}: strength is not rated`,
  );
}

function compareRated(wanted: RatedStrength, has: RatedStrength, candidate: Toothed, notes: FitNotes): void {
  const pairs = [
    ['σ_Hlim', wanted.contact, has.contact],
    ['σ_Flim', wanted.bending, has.bending],
  ] as const;
  const weaker = pairs.filter(([, needs, holds]) => holds < needs);
  for (const [name, needs, holds] of weaker) {
    const short = `${figure(holds, 'N/mm²')}, less than ${figure(needs, 'N/mm²')}`;
    notes.misfit(`${made(candidate)}: ${name} about ${short}`);
  }
  if (weaker.length === 0 && pairs.some(([, needs, holds]) => holds > needs)) {
    const gains = pairs.map(
      ([name, needs, holds]) => `${name} ${figure(holds, '')} for ${figure(needs, '')}`,
    );
    notes.differs(
      `stronger material, ${made(candidate)}: ${gains.join(', ')} N/mm² (typical, confirm with the supplier)`,
    );
  }
}

function sameMaterial(a: Toothed, b: Toothed): boolean {
  const words = ({ material, sizes }: Toothed) =>
    `${plain(material ?? '')}|${plain(sizes.heatTreatment ?? '')}`;
  return a.material !== null && b.material !== null && words(a) === words(b);
}

/** `16MnCr5, case-hardened`. */
function made({ material, sizes }: Toothed): string {
  return [material ?? 'not stated', sizes.heatTreatment].filter(Boolean).join(', ');
}
