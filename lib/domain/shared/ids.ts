/** The one list of id prefixes. An id is `prefix_` and 26 characters of base32: `cmp_5f0…`. */
export const ID_PREFIXES = [
  'usr',
  'org',
  'mbr',
  'inv',
  'cmp',
  'pic',
  'trk',
  'rom',
  'ins',
  'blk',
  'wsh',
  'need',
  'mtg',
  'dft',
  'ord',
  'lin',
  'reg',
  'tkt',
  'pay',
  'rfd',
  'led',
  'rcp',
  'mail',
  'aud',
  'etk',
] as const;

export type IdPrefix = (typeof ID_PREFIXES)[number];
export type Id<P extends IdPrefix> = `${P}_${string}`;

export type UserId = Id<'usr'>;
export type OrganisationId = Id<'org'>;
export type CampId = Id<'cmp'>;
export type TrackId = Id<'trk'>;
export type RoomId = Id<'rom'>;
export type InstructorId = Id<'ins'>;
export type WorkshopId = Id<'wsh'>;
export type MeetingId = Id<'mtg'>;
export type OrderId = Id<'ord'>;
export type RegistrationId = Id<'reg'>;
export type TicketId = Id<'tkt'>;

/** True for a string of the right prefix and alphabet; says nothing of whether the row exists. */
export function isId<P extends IdPrefix>(prefix: P, value: string): value is Id<P> {
  return new RegExp(`^${prefix}_[0-9a-z]{1,40}$`).test(value);
}
