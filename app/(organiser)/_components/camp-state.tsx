import { type MarkTone, StateMark } from '@/components/ui/state-mark';
import type { CampState } from '@/lib/domain/camp/camp-words';
import { CAMP_STATE_WORDS } from '@/lib/domain/camp/state-words';

const TONES = { draft: 'wait', published: 'done', closed: 'off' } satisfies Record<CampState, MarkTone>;

export function CampStateMark({ state }: { state: CampState }) {
  return <StateMark tone={TONES[state]}>{CAMP_STATE_WORDS[state]}</StateMark>;
}
