import { z } from 'zod';
import { lineText } from './line-text';
import { rowId } from './row-id';

/** Bytes of one upload at most. */
export const PICTURE_LIMIT = 10 * 1024 * 1024;

const ALT = 'Say in a few words what the picture shows, for those who cannot see it.';

export const addPictureSchema = z.object({
  campId: rowId('cmp'),
  alt: lineText('Description', 250, ALT),
  file: z
    .instanceof(File, { error: 'Picture is not chosen. Choose a JPEG, PNG or WebP file.' })
    .refine((file) => file.size > 0, 'The file is empty. Choose a JPEG, PNG or WebP file.')
    .refine((file) => file.size <= PICTURE_LIMIT, {
      error: ({ input }) =>
        `The file has ${((input as File).size / 1024 / 1024).toFixed(1)} MB; the limit is 10 MB. Save it smaller and try again.`,
    }),
});
export type AddPictureInput = z.output<typeof addPictureSchema>;

export const editPictureSchema = z.object({
  campId: rowId('cmp'),
  pictureId: rowId('pic'),
  alt: lineText('Description', 250, ALT),
});
export type EditPictureInput = z.output<typeof editPictureSchema>;

export const pictureRowSchema = z.object({ campId: rowId('cmp'), pictureId: rowId('pic') });
export type PictureRowInput = z.output<typeof pictureRowSchema>;
