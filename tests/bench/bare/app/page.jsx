/** Prerendered at build. */
export default function Page() {
  return <p>A static page.</p>;
}
