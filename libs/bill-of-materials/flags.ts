/** Flags with a fixed wording; others carry figures and are built where they arise. */
export const FLAG = {
  notInLibrary: 'not in the library',
  sizeNotChecked: 'size not checked',
  shiftUnknown: 'shift unknown, counted as x = 0',
  allowanceUnknown: 'tooth thickness allowance unknown, counted as none',
  materialNotChosen: 'material not chosen',
  massEstimated: 'mass estimated',
  quantityEstimated: 'quantity estimated',
  draftPart: 'part is a draft, not cleared for use',
  withdrawnPart: 'part is withdrawn',
  bothHandsNeeded: 'a helical pair needs both hands: only one is in stock',
  handNotChosen: 'hand of the helix not chosen',
  sameHand: 'both gears of this stage have the same hand',
  thinRim: 'rim under the keyway is thinner than two modules',
} as const;
