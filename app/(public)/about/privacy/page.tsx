import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';

export const metadata: Metadata = {
  title: 'Privacy in plain words',
  description: 'What is asked for, who sees it, and who to ask about it.',
  alternates: { canonical: '/about/privacy' },
};

export default function PrivacyPage() {
  return (
    <article className="max-w-prose [&_h2]:mt-10 [&_h2]:mb-3 [&_p+p]:mt-3">
      <PageHead
        title="Privacy in plain words"
        lead="We ask for what a camp needs to feed, seat, teach and reach you. Nothing is sold and nobody follows you round."
      />
      <h2>What is asked for</h2>
      <p>
        Your name and e-mail address, your track and the harps you own, what you eat and what you need, and
        someone to call in an emergency. For someone under 18 also a parent or guardian. Your payment details
        go to the payment service and are never stored here.
      </p>
      <h2>Who sees it</h2>
      <ul className="list-disc space-y-2 pl-6">
        <li>The organiser sees everything of their own camp.</li>
        <li>The treasurer sees names, orders and payments, not your health or your needs.</li>
        <li>An instructor sees who is in their sessions and which harps they own.</li>
        <li>The door crew sees names, tracks and what is due.</li>
        <li>Other players see nothing.</li>
      </ul>
      <h2>Cookies</h2>
      <p>
        Only those that the site needs: one that keeps you signed in, one that keeps your answers while you
        register, and one that lets this browser see the orders it made. There is no advertising and no
        visitor counting.
      </p>
      <h2>How long, and who to ask</h2>
      <p>
        Each camp’s organiser decides on your data and answers for it under their local law. To see, correct
        or delete what they hold, or to ask how long they keep it, write to the address on the camp’s page.
        Receipts may have to be kept for years by law.
      </p>
    </article>
  );
}
