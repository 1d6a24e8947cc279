import { Initial1764600000000 } from './migrations/1764600000000-initial.js';

/** Every migration, oldest first. */
export const MIGRATIONS = [Initial1764600000000];
