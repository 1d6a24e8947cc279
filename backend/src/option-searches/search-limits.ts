import { HOUSE_RULES } from '../house-rules/house-rules.js';

/** A search job ends after this with the best found so far; counted from its start. */
export const SEARCH_TIME_LIMIT_MS = HOUSE_RULES.briefSearchTimeLimitMs;

/** A comment is sent down an event stream this often, so that nothing between takes it for dead. */
export const HEARTBEAT_MS = 15_000;

/** Searches of one brief that are listed, newest first. */
export const LISTED_SEARCHES = 50;

export const SERVER_STOPPED = 'The server stopped while this search was under way. Start it again.';
