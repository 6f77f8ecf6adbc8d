import type { Harp } from '../harp/harp';
import type { NeedLevel } from '../harp/harp-ask';
import type { HarpId } from '../harp/harp-id';

/** owned: the attendee has it · loaner: reserved for them at the camp · bring: still to be bought or borrowed. */
export const HARP_SOURCES = ['owned', 'loaner', 'bring'] as const;
export type HarpSource = (typeof HARP_SOURCES)[number];

/** One reason for a harp to be on the list. */
export type PackingUse = {
  meetingId: string;
  workshop: string;
  day: string;
  starts: string;
  ends: string;
  room: string;
  level: NeedLevel;
  /** "song in E, 2nd position → A harp". */
  sentence: string;
  /** Labels of other harps that would do here, in pitch order. */
  others: string[];
  note: string;
};

/** One harp to take. Level helpful: no workshop requires it, and the list of required harps was made without it. */
export type PackingLine = {
  id: HarpId;
  harp: Harp;
  label: string;
  source: HarpSource;
  level: NeedLevel;
  /** In order of time; the first is the first use. Never empty. */
  uses: PackingUse[];
  /** Why this harp where others would do; null where there was nothing to choose. */
  why: string | null;
};

export type PackingStop = Pick<PackingUse, 'meetingId' | 'workshop' | 'starts' | 'ends' | 'room'> & {
  carry: (Pick<PackingLine, 'id' | 'harp' | 'label' | 'source'> &
    Pick<PackingUse, 'level' | 'sentence' | 'note'>)[];
  /** Needs that any key meets: bring what is at hand. */
  anyKey: { level: NeedLevel; note: string }[];
};

export type PackingDay = {
  day: string;
  /** Every harp of the day once, in pitch order. */
  carry: Pick<PackingLine, 'id' | 'harp' | 'label'>[];
  stops: PackingStop[];
};

export type PackingList = {
  /** Required ones first, then helpful ones; each in pitch order, low to high. */
  lines: PackingLine[];
  /** Days with something to carry; meetings that name no harp are left out. */
  days: PackingDay[];
  /** False only when the choices were too many to compare them all: every need is still covered. */
  proven: boolean;
};
