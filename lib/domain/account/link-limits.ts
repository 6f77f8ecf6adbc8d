/** How long the links in our mails work. Each works once. */
export const VERIFY_HOURS = 24;
export const RESET_MINUTES = 60;
export const INVITE_DAYS = 7;
