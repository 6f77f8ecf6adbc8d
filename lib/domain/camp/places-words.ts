/** `42 of 60 places left`, `1 of 60 places left`, `Full`. */
export const placesWords = ({ left, of }: { left: number; of: number }): string =>
  left > 0 ? `${left} of ${of} places left` : 'Full';
