declare const unit: unique symbol;

/**
 * A number that carries its unit in the type only. A plain number is accepted where a unit is asked for;
 * a number of another unit is not, so radians never slip in for degrees.
 */
type InUnit<Name extends string> = number & { readonly [unit]?: Name };

export type Millimetres = InUnit<'mm'>;
export type Degrees = InUnit<'deg'>;
export type Radians = InUnit<'rad'>;
export type Arcminutes = InUnit<'arcmin'>;
export type NewtonMetres = InUnit<'N·m'>;
export type Rpm = InUnit<'rpm'>;
export type Kilowatts = InUnit<'kW'>;
export type Megapascals = InUnit<'MPa'>;
export type Kilograms = InUnit<'kg'>;
/** A length divided by the normal module. */
export type Modules = InUnit<'module'>;

/** Degrees to radians. */
export function degToRad(degrees: Degrees): Radians {
  return (degrees * Math.PI) / 180;
}

/** Radians to degrees. */
export function radToDeg(radians: Radians): Degrees {
  return (radians * 180) / Math.PI;
}

/** Radians to minutes of arc, the unit of angular backlash. */
export function radToArcmin(radians: Radians): Arcminutes {
  return (radians * 10800) / Math.PI;
}
