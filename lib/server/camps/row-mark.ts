import 'server-only';
import { hashToken } from '../hash-token';

/**
 * A short mark of a row with all its parts, as a form showed it. A form carries it, and a save whose mark is no longer
 * the row's own is stale: somebody else saved in between.
 */
export const rowMark = (row: unknown): string => hashToken(JSON.stringify(row)).slice(0, 16);
