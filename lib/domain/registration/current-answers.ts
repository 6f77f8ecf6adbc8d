import type { Programme } from '../timetable/programme';
import type { Answers } from './answers';

/** Answers given earlier, without what the programme no longer has: a track that went is asked for again. */
export function currentAnswers(
  answers: Answers,
  programme: Pick<Programme, 'tracks' | 'workshops'>,
): Answers {
  const { track, ...rest } = answers;
  if (!track || !programme.tracks.some(({ id }) => id === track.trackId)) return rest;
  const electives = new Set(
    programme.workshops.filter(({ audience }) => audience === 'elective').map(({ id }) => id),
  );
  return { ...rest, track: { ...track, electives: track.electives.filter((id) => electives.has(id)) } };
}
