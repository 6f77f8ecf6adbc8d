import type { RoomLoudness, TrackLevel } from '@/lib/domain/camp/camp-words';
import type { HarpAsk, HarpNeed } from '@/lib/domain/harp/harp-ask';
import type { PitchClass } from '@/lib/domain/harp/pitch-class';
import type { Position } from '@/lib/domain/harp/position';
import type { Register } from '@/lib/domain/harp/register';
import type { Tuning } from '@/lib/domain/harp/tuning';
import type { WorkshopAudience, WorkshopKind } from '@/lib/domain/timetable/workshop-words';

const harp = (
  labelKey: PitchClass,
  tuning: Tuning = 'richter',
  register: Register = 'standard',
): HarpAsk => ({ by: 'harp', labelKey, tuning, register });
const song = (tonic: PitchClass, position: Position, minor = false): HarpAsk => ({
  by: 'song',
  songKey: { tonic, minor },
  position,
  tuning: 'richter',
  register: 'standard',
});
const bring = (...anyOf: HarpAsk[]): HarpNeed => ({ level: 'required', anyOf });
const helps = (...anyOf: HarpAsk[]): HarpNeed => ({ level: 'helpful', anyOf });

export const BLOCKS = [
  { starts: '09:30', ends: '10:45', label: 'First morning block' },
  { starts: '11:00', ends: '12:15', label: 'Second morning block' },
  { starts: '14:00', ends: '15:15', label: 'After lunch' },
  { starts: '15:30', ends: '16:45', label: 'Before supper' },
  { starts: '20:00', ends: '21:30', label: 'Evening' },
] as const;

type RoomPlan = { name: string; seats: number; loudness: RoomLoudness; kit: string };
export const ROOMS = [
  { name: 'Long Hall', seats: 170, loudness: 'amplified', kit: 'Stage, PA, piano, 170 chairs' },
  { name: 'Barn', seats: 40, loudness: 'amplified', kit: 'Small PA, drum kit, two guitar amps' },
  { name: 'Boathouse', seats: 30, loudness: 'acoustic', kit: 'Upright piano, lake door' },
  { name: 'Loft', seats: 28, loudness: 'acoustic', kit: 'Music stands' },
  { name: 'Schoolroom', seats: 28, loudness: 'quiet', kit: 'Screen, whiteboard' },
  { name: 'Library', seats: 28, loudness: 'quiet', kit: 'Screen, carpet' },
  { name: 'Tool shed', seats: 10, loudness: 'acoustic', kit: 'Benches, sink, good light' },
] as const satisfies readonly RoomPlan[];

export const INSTRUCTORS = [
  { name: 'Noor Haddad', bio: 'Teaches first notes so that nobody is afraid of hole 2 draw.' },
  { name: 'Isidora Vance', bio: 'Plays fiddle tunes on ten holes; patient with single notes.' },
  { name: 'Tāne Parata', bio: 'Bends, and the way back up from them.' },
  { name: 'Margit Søndergaard', bio: 'Positions, ear training and why a song in E wants an A harp.' },
  { name: 'Desmond Achebe-Wright', bio: 'Band lab and amplified tone; keeps the volume kind.' },
  { name: 'Rosalind Quill', bio: 'Blow bends and the top octave. Repairs what others throw away.' },
] as const;

type TrackPlan = { name: string; level: TrackLevel; gate: string; room: number; share: number };
/** `share` is the track's part of the camp's places, in sixths. */
export const TRACKS = [
  {
    name: 'First breath',
    level: 'start',
    gate: 'Nothing yet. You can sound a note or a chord, or will by the first lunch.',
    room: 2,
    share: 1,
  },
  {
    name: 'Clean notes',
    level: 'clean',
    gate: 'Single notes from 1 to 10, both ways; a tune from memory; 2 draw sounds unbent.',
    room: 3,
    share: 1,
  },
  {
    name: 'First bends',
    level: 'bending',
    gate: 'On a C or A harp you bend 4 draw and 1 draw and come back up.',
    room: 4,
    share: 1,
  },
  {
    name: 'Bends in tune',
    level: 'bending',
    gate: 'You also bend 6 and 2 draw, and know 1st and 2nd position.',
    room: 5,
    share: 1,
  },
  {
    name: 'All eight draw bends',
    level: 'controlled',
    gate: 'You start on, hold and name each of the eight draw bends on a low and a mid key, and follow a twelve-bar.',
    room: 1,
    share: 1,
  },
  {
    name: 'Full range',
    level: 'full-range',
    gate: 'Blow bends 8, 9 and 10 on a low key; 3rd position; a steady vibrato and octaves.',
    room: 0,
    share: 1,
  },
] as const satisfies readonly TrackPlan[];

export type WorkshopPlan = {
  title: string;
  kind: WorkshopKind;
  audience: WorkshopAudience;
  tracks?: number[];
  instructors: number[];
  capacity?: number;
  description: string;
  needs: HarpNeed[];
  /** [day, block, room]; day 0 is the arrival day. */
  meets: [number, number, number][];
};

const daily = (block: number, room: number): [number, number, number][] =>
  [1, 2, 3].map((day) => [day, block, room]);

export const WORKSHOPS: readonly WorkshopPlan[] = [
  {
    title: 'Breath first',
    kind: 'technique',
    audience: 'core',
    tracks: [0],
    instructors: [0],
    description: 'Sitting, breathing, one hole at a time. Stop and sit whenever you feel light-headed.',
    needs: [bring(harp('C'))],
    meets: daily(0, 2),
  },
  {
    title: 'Three tunes by heart',
    kind: 'technique',
    audience: 'core',
    tracks: [0],
    instructors: [1],
    description: 'A tune a day, no paper.',
    needs: [bring(harp('C')), helps(harp('G'))],
    meets: daily(2, 2),
  },
  {
    title: 'Single notes, both ways',
    kind: 'technique',
    audience: 'core',
    tracks: [1],
    instructors: [1],
    description: 'Holes 1 to 10 up and down, puckered or tongue-blocked.',
    needs: [bring(harp('C'), harp('A'))],
    meets: daily(0, 3),
  },
  {
    title: 'Songs in two positions',
    kind: 'technique',
    audience: 'core',
    tracks: [1],
    instructors: [2],
    description: 'The same tune in 1st and 2nd position.',
    needs: [bring(song('C', 1)), bring(song('E', 2))],
    meets: daily(2, 3),
  },
  {
    title: 'Four draw and back',
    kind: 'technique',
    audience: 'core',
    tracks: [2],
    instructors: [2],
    description: 'The first bend, on the key where it is easiest.',
    needs: [bring(harp('A'), harp('C'))],
    meets: daily(0, 4),
  },
  {
    title: 'Twelve bars slowly',
    kind: 'technique',
    audience: 'core',
    tracks: [2],
    instructors: [3],
    description: 'Where you are in the twelve bars, and what to leave out.',
    needs: [bring(song('E', 2)), helps(song('G', 2))],
    meets: daily(2, 4),
  },
  {
    title: 'Bends against a drone',
    kind: 'technique',
    audience: 'core',
    tracks: [3],
    instructors: [3],
    description: 'Hear the note before you reach it.',
    needs: [bring(harp('A')), bring(harp('D'), harp('C'))],
    meets: daily(0, 5),
  },
  {
    title: 'Second position, three keys',
    kind: 'technique',
    audience: 'core',
    tracks: [3],
    instructors: [4],
    description: 'One lick carried through E, G and D.',
    needs: [bring(song('E', 2)), bring(song('G', 2)), bring(song('D', 2))],
    meets: daily(2, 5),
  },
  {
    title: 'Every draw bend by name',
    kind: 'technique',
    audience: 'core',
    tracks: [4],
    instructors: [4],
    description: 'All eight, low harp and mid harp.',
    needs: [bring(harp('G')), bring(harp('C'))],
    meets: daily(0, 1),
  },
  {
    title: 'Minor songs',
    kind: 'technique',
    audience: 'core',
    tracks: [4],
    instructors: [5],
    description: 'A minor in 3rd, 4th and 5th position, and what a natural minor harp does for you.',
    needs: [bring(song('A', 3, true)), bring(song('A', 4, true)), helps(harp('G', 'natural-minor'))],
    meets: daily(2, 1),
  },
  {
    title: 'The top octave',
    kind: 'technique',
    audience: 'core',
    tracks: [5],
    instructors: [5],
    description: 'Blow bends 8, 9 and 10 without forcing.',
    needs: [bring(harp('G')), bring(harp('Bb'))],
    meets: daily(0, 0),
  },
  {
    title: 'Third position and Low F',
    kind: 'technique',
    audience: 'core',
    tracks: [5],
    instructors: [0],
    description: 'Songs in D and G minor; the low register under them.',
    needs: [bring(song('D', 3)), bring(song('G', 3, true)), helps(harp('F', 'richter', 'low'))],
    meets: daily(2, 0),
  },

  {
    title: 'Train rhythms',
    kind: 'technique',
    audience: 'elective',
    instructors: [0],
    capacity: 24,
    description: 'Chords, hands and a long hill.',
    needs: [bring(harp('A'), harp('C'))],
    meets: [
      [1, 1, 2],
      [2, 1, 2],
    ],
  },
  {
    title: 'Ear training with ten holes',
    kind: 'theory',
    audience: 'elective',
    instructors: [3],
    capacity: 26,
    description: 'Intervals you already play.',
    needs: [{ level: 'helpful', anyOf: [] }],
    meets: [
      [1, 1, 5],
      [3, 1, 5],
    ],
  },
  {
    title: 'Amplified tone',
    kind: 'band-lab',
    audience: 'elective',
    instructors: [4],
    capacity: 16,
    description: 'Cupping, volume, and hearing that lasts: protection is on the table.',
    needs: [bring(harp('A')), helps(harp('D'))],
    meets: [
      [1, 1, 1],
      [2, 1, 1],
    ],
  },
  {
    title: 'Fiddle tunes in G and D',
    kind: 'technique',
    audience: 'elective',
    instructors: [1],
    capacity: 20,
    description: 'Reels at a walking pace, then at theirs.',
    needs: [bring(song('G', 1)), bring(harp('D', 'paddy-richter'), harp('D'))],
    meets: [
      [2, 1, 3],
      [3, 1, 3],
    ],
  },
  {
    title: 'Repair bench',
    kind: 'repair-bench',
    audience: 'elective',
    instructors: [5],
    capacity: 8,
    description: 'Open it, clean it, gap it. Bring one old harp that is your own.',
    needs: [{ level: 'required', anyOf: [], note: 'Any harp of your own that needs care' }],
    meets: [
      [1, 3, 6],
      [2, 3, 6],
      [3, 3, 6],
    ],
  },
  {
    title: 'Band lab: shuffle in A',
    kind: 'band-lab',
    audience: 'elective',
    instructors: [4],
    capacity: 12,
    description: 'With drums and bass: come in, leave room, get out.',
    needs: [bring(song('A', 2))],
    meets: [
      [1, 3, 1],
      [3, 3, 1],
    ],
  },
  {
    title: 'Country in the major key',
    kind: 'technique',
    audience: 'elective',
    instructors: [1],
    capacity: 24,
    description: 'Pentatonic lines in 2nd position; the country tuning is welcome, not needed.',
    needs: [bring(song('G', 2)), helps(harp('C', 'country'))],
    meets: [
      [2, 3, 3],
      [3, 3, 3],
    ],
  },
  {
    title: 'Chromatic taster',
    kind: 'technique',
    audience: 'elective',
    instructors: [3],
    capacity: 14,
    description: 'Twelve holes, one button. Some to look at; you blow only your own.',
    needs: [helps(harp('C', 'solo'))],
    meets: [
      [1, 3, 4],
      [2, 3, 4],
    ],
  },

  {
    title: 'Opening jam',
    kind: 'jam',
    audience: 'everyone',
    instructors: [4],
    description: 'Two chords, everyone in.',
    needs: [bring(song('G', 2), song('G', 1))],
    meets: [[0, 4, 0]],
  },
  {
    title: 'Open mic',
    kind: 'open-mic',
    audience: 'everyone',
    instructors: [0],
    description: 'One tune each, kind ears.',
    needs: [],
    meets: [[1, 4, 0]],
  },
  {
    title: 'Porch jam',
    kind: 'jam',
    audience: 'everyone',
    instructors: [1],
    description: 'Slow blues in E, then requests.',
    needs: [bring(song('E', 2))],
    meets: [[2, 4, 0]],
  },
  {
    title: 'Camp concert',
    kind: 'concert',
    audience: 'everyone',
    instructors: [5],
    description: 'Every track plays one piece.',
    needs: [],
    meets: [[3, 4, 0]],
  },
];
