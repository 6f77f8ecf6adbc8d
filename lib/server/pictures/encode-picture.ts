import 'server-only';
import sharp from 'sharp';
import { ok, type Result } from '@/lib/domain/shared/result';

export const LONGEST_SIDE = 2400;
/** Above what any camera phone makes; a small file that unfolds to more is refused before it takes the memory. */
const PIXELS = 64_000_000;

const starts = (bytes: Uint8Array, at: number, ...signs: number[]): boolean =>
  signs.every((sign, offset) => bytes[at + offset] === sign);

/** By the first bytes, whatever the name or the browser says. Nothing else ever reaches the decoder: no SVG, GIF, AVIF, HEIF. */
export function pictureKind(bytes: Uint8Array): 'jpeg' | 'png' | 'webp' | null {
  if (starts(bytes, 0, 0xff, 0xd8, 0xff)) return 'jpeg';
  if (starts(bytes, 0, 0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a)) return 'png';
  if (starts(bytes, 0, 0x52, 0x49, 0x46, 0x46) && starts(bytes, 8, 0x57, 0x45, 0x42, 0x50)) return 'webp';
  return null;
}

/**
 * Decodes and writes anew as WebP: upright, at most 2400 px a side, without EXIF, place or device. Whatever else the
 * file carried is gone. The error is a sentence for the file's field.
 */
export async function encodePicture(
  bytes: Uint8Array,
): Promise<Result<{ content: Uint8Array; width: number; height: number }, string>> {
  const kind = pictureKind(bytes);
  if (!kind)
    return {
      ok: false,
      error:
        'The file is not a JPEG, PNG or WebP picture, whatever its name says. Save it as one of these and try again.',
    };
  try {
    const read = sharp(bytes, { limitInputPixels: PIXELS, failOn: 'error' });
    const { format, width, height } = await read.metadata();
    if (format !== kind) return { ok: false, error: BROKEN };
    if (width * height > PIXELS) return { ok: false, error: FLOOD };
    const { data, info } = await read
      .autoOrient()
      .resize({ width: LONGEST_SIDE, height: LONGEST_SIDE, fit: 'inside', withoutEnlargement: true })
      .webp({ quality: 82 })
      .toBuffer({ resolveWithObject: true });
    return ok({ content: data, width: info.width, height: info.height });
  } catch (error) {
    const flood = error instanceof Error && /pixel limit/i.test(error.message);
    return { ok: false, error: flood ? FLOOD : BROKEN };
  }
}

const BROKEN = 'The picture is damaged or cut short, so it cannot be read. Save it again and retry.';
const FLOOD = 'The picture has more than 64 million pixels. Save it smaller and try again.';
