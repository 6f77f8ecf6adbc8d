import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import { Lines } from '@/emails/parts/letter-parts';

test('refund terms stand in a letter as they were typed: a line stays a line, a blank line parts paragraphs', () => {
  const html = renderToStaticMarkup(<Lines text={'Until May: all.\r\nLater: half.\n\nNever: nothing.'} />);
  expect(html).toMatch(/Until May: all\.<br\/>Later: half\./);
  expect(html.match(/<p /g)).toHaveLength(2);
});
