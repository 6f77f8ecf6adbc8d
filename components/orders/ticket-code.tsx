type TicketCodeProps = {
  /** Whose ticket, for those who cannot see the code. */
  name: string;
  code: { size: number; path: string };
  className?: string;
};

/** The QR code on a white card, black on white by night too: readers want dark on light and an edge of white. */
export function TicketCode({ name, code: { size, path }, className = '' }: TicketCodeProps) {
  return (
    <div className={`rounded border border-line bg-white p-1 ${className}`}>
      <svg
        viewBox={`0 0 ${size} ${size}`}
        role="img"
        aria-label={`Ticket code of ${name}`}
        shapeRendering="crispEdges"
        className="block h-auto w-full"
      >
        <path d={`M0 0h${size}v${size}h-${size}z`} fill="#fff" />
        <path d={path} fill="#000" />
      </svg>
    </div>
  );
}
