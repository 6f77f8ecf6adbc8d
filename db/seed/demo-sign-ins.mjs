/** The demo's accounts, one a role; known to everyone, made by the seed only. */
export const DEMO_PASSWORD = 'ten holes in a comb';

export const SIGN_INS = [
  { role: 'organiser', email: 'ana@slateridge.example', name: 'Ana Teixeira' },
  { role: 'treasurer', email: 'tomasz@slateridge.example', name: 'Tomasz Wójcik' },
  { role: 'instructor', email: 'noor@slateridge.example', name: 'Noor Haddad' },
  { role: 'door', email: 'mei@slateridge.example', name: 'Mei-Lin Chou' },
  { role: 'attendee', email: 'oskar@players.example', name: 'Oskar Lindqvist' },
];
