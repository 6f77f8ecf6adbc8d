/** Characters, counted after NFC. Eight is the floor of ASVS 6.2.1; nothing is cut off at the top, it is refused. */
export const PASSWORD_LEAST = 8;
export const PASSWORD_MOST = 200;
export const NAME_MOST = 120;
