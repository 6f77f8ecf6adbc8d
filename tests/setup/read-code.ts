import jsQR from 'jsqr';
import sharp from 'sharp';

/** The text of a QR code in a picture, by a reader that did not write it; throws where there is none. */
export async function readCode(picture: Buffer): Promise<string> {
  const { data, info } = await sharp(picture)
    .flatten({ background: '#fff' })
    .ensureAlpha()
    .raw()
    .toBuffer({ resolveWithObject: true });
  const found = jsQR(new Uint8ClampedArray(data), info.width, info.height);
  if (!found) throw new Error('No code in the picture');
  return found.data;
}
