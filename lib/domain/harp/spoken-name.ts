/** For the ear: `Bb` → "B flat", `F#` → "F sharp", `Ebm natural minor` → "E flat minor natural minor". */
export const spokenName = (label: string): string =>
  label.replace(
    /\b([A-G])(b|#)?(m)?(?![a-z])/g,
    (_, letter: string, sign?: string, minor?: string) =>
      `${letter}${sign ? (sign === 'b' ? ' flat' : ' sharp') : ''}${minor ? ' minor' : ''}`,
  );
