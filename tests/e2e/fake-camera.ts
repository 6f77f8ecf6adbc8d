import { writeFileSync } from 'node:fs';
import sharp from 'sharp';

const WIDTH = 640;
const HEIGHT = 480;

/**
 * Writes a picture as an uncompressed video (YUV4MPEG2, 4:2:0) for Chromium's fake camera, which plays it in a loop.
 * The picture is shown at `share` of the height on mid-grey, as a phone would see a ticket held up to it.
 */
export async function writeCameraVideo(picture: Buffer, file: string, share = 0.7): Promise<void> {
  const side = Math.round(HEIGHT * share);
  const held = await sharp(picture)
    .resize(side, side, { fit: 'contain', background: '#fff' })
    .flatten({ background: '#fff' })
    .png()
    .toBuffer();
  const luma = await sharp({ create: { width: WIDTH, height: HEIGHT, channels: 3, background: '#8a8a8a' } })
    .composite([{ input: held, gravity: 'centre' }])
    .greyscale()
    .raw()
    .toBuffer();
  const neutral = Buffer.alloc((WIDTH / 2) * (HEIGHT / 2) * 2, 128);
  const frame = Buffer.concat([Buffer.from('FRAME\n'), luma, neutral]);
  const header = Buffer.from(`YUV4MPEG2 W${WIDTH} H${HEIGHT} F10:1 Ip A1:1 C420\n`);
  writeFileSync(file, Buffer.concat([header, ...Array.from({ length: 10 }, () => frame)]));
}

/** Launch arguments for a browser whose camera shows that video and asks nobody. */
export const cameraArgs = (file: string): string[] => [
  '--use-fake-ui-for-media-stream',
  '--use-fake-device-for-media-stream',
  `--use-file-for-fake-video-capture=${file}`,
];
