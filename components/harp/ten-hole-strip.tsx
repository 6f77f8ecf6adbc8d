import type { HoleNotes } from '@/lib/domain/harp/note-map';
import { filledHoles, HOLES } from './filled-holes';
import type { Sounding } from './note-column';
import { NoteMap } from './note-map';
import { type HoleLook, StripHoles } from './strip-holes';

export type TenHoleStripProps = { className?: string } & (
  | { mode: 'places' /** Places left of all. */; left: number; of: number /** What sells. */; what?: string }
  | { mode: 'steps' /** The step one is at, from 1. */; step: number; names: readonly string[] }
  | { mode: 'mark' /** Left out where the name stands beside it. */; label?: string }
  | { mode: 'notes' /** "A", "Low F". */; label: string; holes: readonly HoleNotes[]; sounding?: Sounding }
);

const row = (count: number, look: (hole: number) => HoleLook): HoleLook[] =>
  Array.from({ length: count }, (_, index) => look(index + 1));

/** The product's one motif, always with a meaning: places left, steps of a form, its mark, the notes of a harp. */
export function TenHoleStrip(props: TenHoleStripProps) {
  switch (props.mode) {
    case 'places': {
      const { left, of, what, className } = props;
      const filled = filledHoles(left, of);
      const words = left > 0 ? `${left} of ${of} places left` : 'full, no places left';
      return (
        <StripHoles
          looks={row(HOLES, (hole) => (hole <= filled ? 'filled' : 'open'))}
          label={what ? `${what}: ${words}` : words}
          className={className}
        />
      );
    }
    case 'steps': {
      const { step, names, className } = props;
      return (
        <StripHoles
          looks={row(names.length, (hole) => (hole < step ? 'filled' : hole === step ? 'brass' : 'open'))}
          label={`Step ${step} of ${names.length}: ${names[step - 1] ?? ''}`}
          numbered
          className={className}
        />
      );
    }
    case 'mark':
      return <StripHoles looks={row(HOLES, () => 'brass')} label={props.label} className={props.className} />;
    case 'notes':
      return <NoteMap {...props} />;
  }
}
