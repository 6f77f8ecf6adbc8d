type PictureProps = {
  id: string;
  alt: string;
  width: number;
  height: number;
  className?: string;
  eager?: boolean;
};

/** One of our own re-encoded pictures. Next's optimiser stays off, so a plain `img` it is. */
export function Picture({ id, alt, width, height, className, eager = false }: PictureProps) {
  return (
    <img
      src={`/api/pictures/${id}`}
      alt={alt}
      width={width}
      height={height}
      loading={eager ? 'eager' : 'lazy'}
      decoding="async"
      className={className}
    />
  );
}
