/**
 * Structured data in the page. `<` is written as its escape, so that no name can end the script element (ASVS 1.2.1);
 * a data block is never run, and carries the nonce so that no policy has to make an exception for it.
 */
export function EventScript({ data, nonce }: { data: object; nonce?: string }) {
  const json = JSON.stringify(data).replace(/</g, '\\u003c');
  return (
    <script
      type="application/ld+json"
      nonce={nonce}
      suppressHydrationWarning
      dangerouslySetInnerHTML={{ __html: json }}
    />
  );
}
