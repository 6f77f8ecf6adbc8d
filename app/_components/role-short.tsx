import { DeadEnd } from '@/components/ui/dead-end';

/** For a person of the organisation whose role falls short. Only staff pages send it along; public ones cannot need it. */
export function RoleShort() {
  return (
    <DeadEnd title="Your role does not cover this" way={{ href: '/organise', words: 'To my camps' }}>
      <p>
        You are signed in, but this page needs another role in this organisation. Ask an organiser to give it
        to you.
      </p>
    </DeadEnd>
  );
}
