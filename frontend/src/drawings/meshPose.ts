import type { MeshGeometry } from '@stageyard/libs/gear-geometry';
import type { Point } from './ink';

/** Where two outlines stand so that the driving flanks touch; mm, y up, the pitch point at the origin. */
export interface MeshPose {
  pinionCentre: Point;
  wheelCentre: Point;
  /** Turns (radians, anticlockwise) of outlines whose first tooth is centred on +y. */
  pinionTurn: number;
  wheelTurn: number;
  pinionPitchRadius: number;
  wheelPitchRadius: number;
  /** Ends of the line of action, and of the path of contact on it. */
  t1: Point;
  t2: Point;
  a: Point;
  e: Point;
}

/**
 * The pinion stands above and drives clockwise, so its tooth at the pitch point moves left and pushes with its left
 * flank; the line of action falls from the upper right (T1) to the lower left (T2).
 */
export function meshPose(mesh: MeshGeometry, pinionTeeth: number, wheelTeeth: number): MeshPose {
  const pinionPitchRadius = (mesh.centreDistance * pinionTeeth) / (pinionTeeth + wheelTeeth);
  const wheelPitchRadius = mesh.centreDistance - pinionPitchRadius;
  const angle = (mesh.operatingPressureAngleDeg * Math.PI) / 180;
  const along = (distance: number): Point => ({
    x: -distance * Math.cos(angle),
    y: -distance * Math.sin(angle),
  });
  return {
    pinionCentre: { x: 0, y: pinionPitchRadius },
    wheelCentre: { x: 0, y: -wheelPitchRadius },
    pinionTurn: Math.PI,
    // A gap of the wheel faces the pinion's tooth; half the play is taken up so that the driving flanks touch.
    wheelTurn: Math.PI / wheelTeeth - mesh.circumferentialBacklash / 2 / wheelPitchRadius,
    pinionPitchRadius,
    wheelPitchRadius,
    t1: along(-pinionPitchRadius * Math.sin(angle)),
    t2: along(wheelPitchRadius * Math.sin(angle)),
    a: along(-mesh.approachLength),
    e: along(mesh.recessLength),
  };
}
