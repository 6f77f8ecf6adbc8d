export const dynamic = 'force-dynamic';

/** Rendered for each request, from nothing. */
export default function Page() {
  return <p>A page of no data.</p>;
}
