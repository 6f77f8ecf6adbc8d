/** What a person may hold in an organisation; everyone may be an attendee besides. */
export const STAFF_ROLES = ['organiser', 'treasurer', 'instructor', 'door'] as const;
export type StaffRole = (typeof STAFF_ROLES)[number];

export const ROLE_WORDS = {
  organiser: 'Organiser',
  treasurer: 'Treasurer',
  instructor: 'Instructor',
  door: 'Door crew',
} satisfies Record<StaffRole, string>;
