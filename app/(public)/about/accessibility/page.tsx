import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';

export const metadata: Metadata = {
  title: 'Accessibility',
  description: 'How this site is built to be used by everyone, and what to do where it falls short.',
  alternates: { canonical: '/about/accessibility' },
};

export default function AccessibilityPage() {
  return (
    <article className="max-w-prose [&_h2]:mt-10 [&_h2]:mb-3 [&_p+p]:mt-3">
      <PageHead
        title="Accessibility"
        lead="Everything here is meant to work with a keyboard, a screen reader, large text and a bright day."
      />
      <h2>What we aim at</h2>
      <p>
        The Web Content Accessibility Guidelines, version 2.2, level AA. Each page is checked by machine and
        by eye in light and dark, on a phone’s width and a desk’s, and with the keyboard alone.
      </p>
      <h2>What to expect</h2>
      <ul className="list-disc space-y-2 pl-6">
        <li>Camp pages, registering and paying work without JavaScript.</li>
        <li>A state is a word and a shape, never a colour alone.</li>
        <li>Times are given with their day and zone; a place kept for you says how long it is kept.</li>
        <li>Keys are read out in full: “B flat”, not “Bb”.</li>
        <li>
          Colours follow your device, light or dark. Motion stops when you ask your device for less of it.
        </li>
        <li>Text may be enlarged to four times its size without losing anything.</li>
      </ul>
      <h2>At the camp itself</h2>
      <p>
        Each camp is run by its own organiser, who knows the doors, beds and paths of the venue. The address
        to write to is on the camp’s page; when you register there is room to say what you need.
      </p>
      <h2>Where we fall short</h2>
      <p>
        If something here gets in your way, write to the organiser of your camp: they can register you by
        hand, and pass the fault on.
      </p>
    </article>
  );
}
