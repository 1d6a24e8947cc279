export * from './errors.js';
export * from './brands.js';
export {
  compareRatios,
  divide,
  multiply,
  parseDecimal,
  ratio,
  toRatio,
  type Ratio,
  type RatioInput,
} from './ratio.js';
export {
  formatExactRatio,
  formatRatio,
  ratioErrorPercent,
  ratioToFixed,
  ratioToNumber,
  withinTolerance,
} from './ratio-figures.js';
export { convergents, mediants, type Approximation, type ApproximationLimits } from './approximations.js';
export { CURRENCY_CODES, currencyDecimals } from './currencies.js';
export { addMoney, formatMoney, money, multiplyMoney, parseMoney, type Money } from './money.js';
export * from './format.js';
export { parseQuantity, type QuantityKind } from './parse-quantity.js';
