import type { HoleNotes } from '@/lib/domain/harp/note-map';
import { spokenName } from '@/lib/domain/harp/spoken-name';

const DEPTH_WORDS = ['unbent', 'half step', 'whole step', 'step and a half'] as const;

/** The note map for those who hear the page: the same facts, one hole a row. */
export function NoteTable({ label, holes }: { label: string; holes: readonly HoleNotes[] }) {
  return (
    <div className="sr-only">
      <table>
        <caption>Notes of the {label} harp, hole by hole</caption>
        <thead>
          <tr>
            <th scope="col">Hole</th>
            <th scope="col">Blow</th>
            <th scope="col">Draw</th>
            <th scope="col">Bends, overbends, slide</th>
          </tr>
        </thead>
        <tbody>
          {holes.map((hole) => (
            <tr key={hole.hole}>
              <th scope="row">{hole.hole}</th>
              <td>{said(hole.blow.note)}</td>
              <td>{said(hole.draw.note)}</td>
              <td>{extras(hole)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

/** `Bb4` → "B flat 4". */
const said = (note: string): string => {
  const [, name = note, octave = ''] = /^(\D+?)(-?\d+)$/.exec(note) ?? [];
  return `${spokenName(name)} ${octave}`.trim();
};

function extras({ bends, overbend, slide }: HoleNotes): string {
  const parts = bends.map(
    ({ breath, depth, note }) => `${breath} bent a ${DEPTH_WORDS[depth]}: ${said(note)}`,
  );
  if (overbend && !overbend.repeats)
    parts.push(`${overbend.breath === 'blow' ? 'overblow' : 'overdraw'}: ${said(overbend.note)}`);
  if (slide) parts.push(`slide in, blow ${said(slide.blow.note)}, draw ${said(slide.draw.note)}`);
  return parts.join('; ') || 'none';
}
