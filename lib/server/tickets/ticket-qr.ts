import 'server-only';
import QRCode from 'qrcode';

// Four light modules all round, as ISO/IEC 18004 asks. Level M survives a crease and still fits a phone's width.
const QUIET = 4;
const LEVEL = 'M';

/** A code as one path of unit squares, `size` units wide with its quiet zone: for pages and PDF, sharp at any size. */
export function ticketQr(text: string): { size: number; path: string } {
  const { modules } = QRCode.create([{ data: text, mode: 'alphanumeric' }], { errorCorrectionLevel: LEVEL });
  let path = '';
  for (let row = 0; row < modules.size; row += 1)
    for (let column = 0; column < modules.size; column += 1) {
      let length = 0;
      while (column + length < modules.size && modules.get(row, column + length)) length += 1;
      if (length > 0) path += `M${column + QUIET} ${row + QUIET}h${length}v1h-${length}z`;
      column += length;
    }
  return { size: modules.size + 2 * QUIET, path };
}

/** For mail: black on white, whatever the reader's colours. Eight pixels a module is 424 px wide. */
export const ticketPng = (text: string): Promise<Buffer> =>
  QRCode.toBuffer([{ data: text, mode: 'alphanumeric' }], {
    errorCorrectionLevel: LEVEL,
    margin: QUIET,
    scale: 8,
    color: { dark: '#000000ff', light: '#ffffffff' },
  });
