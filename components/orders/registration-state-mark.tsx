import { type MarkTone, StateMark } from '@/components/ui/state-mark';
import { type RegistrationState, STATE_WORDS } from '@/lib/domain/registration/states';

const TONES = {
  held: 'wait',
  confirmed: 'done',
  waitlisted: 'open',
  offered: 'wait',
  cancelled: 'stop',
  transferred: 'off',
  expired: 'off',
} satisfies Record<RegistrationState, MarkTone>;

export function RegistrationStateMark({ state }: { state: RegistrationState }) {
  return <StateMark tone={TONES[state]}>{STATE_WORDS[state]}</StateMark>;
}
