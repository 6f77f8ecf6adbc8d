import type { Metadata } from 'next';
import { ActionButton } from '@/components/forms/action-button';
import { ActionForm } from '@/components/forms/action-form';
import { FileField } from '@/components/forms/file-field';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { Picture } from '@/components/ui/picture';
import { PICTURE_LIMIT } from '@/lib/schemas/picture';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listPictures } from '@/lib/server/pictures/list-pictures';
import { DoneNotice } from '../../../../_components/done-notice';
import { MoveButtons } from '../../../../_components/move-buttons';
import { addPictureAction, deletePictureAction, editPictureAction } from './actions';

export const metadata: Metadata = { title: 'Pictures' };

const ALT_HINT = 'Read aloud in its place: what would you tell somebody on the phone?';

export default async function PicturesPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/pictures'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const pictures = listPictures(camp.id);
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={camp.name}
        title="Pictures"
        lead="Shown on the public page in this order. Ask the people in them first."
      />
      {pictures.length > 0 && (
        <ol className="-mt-6 mb-12">
          {pictures.map(({ id, alt, width, height }, at) => (
            <li
              key={id}
              className="grid gap-x-8 gap-y-3 border-b border-line py-5 md:grid-cols-[16rem_minmax(0,1fr)_auto]"
            >
              <Picture
                id={id}
                alt={alt}
                width={width}
                height={height}
                className="max-h-64 w-full object-contain"
              />
              <div className="min-w-0">
                <ActionForm
                  action={editPictureAction}
                  submit="Save the words"
                  tone="plain"
                  hidden={{ campId: camp.id, pictureId: id }}
                  defaultValue={{ alt }}
                  className="grid max-w-prose gap-3"
                >
                  <TextField name="alt" label="What it shows" />
                </ActionForm>
                <details className="mt-2">
                  <summary className="inline-flex min-h-target items-center text-reed underline underline-offset-4">
                    Delete this picture
                  </summary>
                  <ActionButton
                    action={deletePictureAction}
                    hidden={{ campId: camp.id, pictureId: id }}
                    tone="danger"
                    label={`Delete for good: ${alt}`}
                  >
                    Delete for good
                  </ActionButton>
                </details>
              </div>
              <MoveButtons
                campId={camp.id}
                list="pictures"
                id={id}
                name={`picture ${at + 1}`}
                first={at === 0}
                last={at === pictures.length - 1}
              />
            </li>
          ))}
        </ol>
      )}
      <h2 className="mb-4">Add a picture</h2>
      <ActionForm action={addPictureAction} submit="Upload" hidden={{ campId: camp.id }}>
        <FileField
          name="file"
          label="Picture"
          accept="image/jpeg,image/png,image/webp"
          limit={PICTURE_LIMIT}
          hint="JPEG, PNG or WebP, up to 10 MB. It is saved anew without place, device or other hidden data."
        />
        <TextField name="alt" label="What it shows" hint={ALT_HINT} />
      </ActionForm>
    </>
  );
}
