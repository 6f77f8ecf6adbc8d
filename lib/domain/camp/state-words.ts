import type { CampState } from './camp-words';

export const CAMP_STATE_WORDS = {
  draft: 'Draft',
  published: 'On sale',
  closed: 'Closed',
} satisfies Record<CampState, string>;
