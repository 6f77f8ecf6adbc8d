import type { Metadata } from 'next';
import { DeadEnd } from '@/components/ui/dead-end';

export const metadata: Metadata = { title: 'Nothing to show', robots: { index: false } };

type PageProps = { params: Promise<{ what: string }> };

/** Where browsers without JavaScript are sent from an answer that has a status but no body. */
export default async function DeadEndPage({ params }: PageProps) {
  const { what } = await params;
  const { title, says } = WORDS[what] ?? NOTHING;
  return (
    <DeadEnd title={title}>
      <p>{says}</p>
    </DeadEnd>
  );
}

const NOTHING = {
  title: 'There is nothing here',
  says: 'The address may be mistyped, the camp may not be published, or the page is not yours to see. Go back, check the link, or sign in with the address it was sent to.',
};

const WORDS: Record<string, { title: string; says: string }> = {
  '403': {
    title: 'Your role does not cover this',
    says: 'You are signed in, but that page needs another role in its organisation. Ask an organiser to give it to you.',
  },
  '500': {
    title: 'Something went wrong on our side',
    says: 'Nothing that you sent was lost. Go back and try again; if it stays, write to the organiser of your camp.',
  },
};
