import { Initial1764600000000 } from './migrations/1764600000000-initial.js';
import { Supply1764700000000 } from './migrations/1764700000000-supply.js';

/** Every migration, oldest first. */
export const MIGRATIONS = [Initial1764600000000, Supply1764700000000];
