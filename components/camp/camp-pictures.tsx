import type { Programme } from '@/lib/domain/timetable/programme';

/** The organiser's pictures, re-encoded by us; as many as there are, at the height of a hand. */
export function CampPictures({ pictures }: Pick<Programme, 'pictures'>) {
  if (pictures.length === 0) return null;
  return (
    <ul className="mt-10 flex flex-wrap gap-3">
      {pictures.map(({ id, alt, width, height }, index) => (
        <li key={id} className="min-w-[min(100%,16rem)] flex-1" style={{ flexGrow: width / height }}>
          <img
            src={`/api/pictures/${id}`}
            alt={alt}
            width={width}
            height={height}
            loading={index === 0 ? 'eager' : 'lazy'}
            decoding="async"
            className="h-64 w-full rounded border border-edge object-cover"
          />
        </li>
      ))}
    </ul>
  );
}
