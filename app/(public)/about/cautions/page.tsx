import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';

export const metadata: Metadata = {
  title: 'Playing with care',
  description: 'Breath, ears, borrowed harps, allergies and minors at a harmonica camp.',
  alternates: { canonical: '/about/cautions' },
};

export default function CautionsPage() {
  return (
    <article className="max-w-prose [&_h2]:mt-10 [&_h2]:mb-3 [&_p+p]:mt-3">
      <PageHead
        title="Playing with care"
        lead="The usual cautions, in plain words. Local law, the rules of the venue, and people licensed to advise you come first."
      />
      <h2>Breath</h2>
      <p>
        Long playing, low harps and hard draw bends can make you breathe too much. If you feel light-headed,
        tingling or unwell: stop, sit down, breathe normally. Don’t play on.
      </p>
      <p>
        If you have asthma, a heart condition or anything else that touches your breathing, ask your doctor
        before a week of playing, and tell the organiser what you need. Teachers are not doctors and don’t
        give medical advice.
      </p>
      <h2>Ears</h2>
      <p>
        Amplified sessions are loud. Noise guidance for work in the United States (NIOSH) allows 8 hours a day
        at 85 decibels and halves the time for every 3 decibels more: 4 hours at 88, 1 hour at 94, a quarter
        of an hour at 100. Nobody at camp measures this for you. Wear plugs near amplifiers, rest your ears in
        a quiet room, and leave if your ears ring.
      </p>
      <h2>Borrowed harps</h2>
      <p>
        Play your own wherever you can. A loaner is one person’s for the whole camp: it is stripped and
        cleaned when it comes back and rests before the next player has it. Never share a harp, not even for
        one chorus. Wash your hands and rinse your mouth before playing.
      </p>
      <h2>Allergies and food</h2>
      <p>
        Say it when you register; the kitchen sees it. On arrival, ask the kitchen yourself before the first
        meal. Carry your own medicine. In an emergency call the local emergency number first.
      </p>
      <h2>Children and young people</h2>
      <p>
        Someone under 18 comes with the consent of a parent or guardian, which the organiser asks for before
        arrival. The organiser is responsible for safeguarding under the law of the place, and can tell you
        who to speak to.
      </p>
      <h2>Alcohol</h2>
      <p>The house rules of the venue apply. Nobody has to drink to be part of the jam.</p>
    </article>
  );
}
