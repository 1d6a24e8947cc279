/** Shown where results are shown, and on every export. */
export const CAUTIONS = [
  'Gear failures injure people. These results are for selection and comparison by a competent person; they are not a certified rating.',
  'Strength is not rated here: shafts are sized for torsion only, and only where a torque is given.',
  'Final design, guarding and the loads assumed are for licensed or otherwise authorised engineers under local codes (machinery safety law, ISO 12100; lifting and hoisting rules where a load hangs on the train).',
  'Not covered: dynamic shock, shaft bending, bearing life, lubrication failure, thermal rating.',
] as const;

/** One line for the head of a sheet. */
export const CAUTION_LINE =
  'For selection by a competent person, not a certified rating. See the cautions on the sheet “Checks”.';
