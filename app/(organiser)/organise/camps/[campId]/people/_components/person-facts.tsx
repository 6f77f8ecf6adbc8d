import type { Route } from 'next';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { HarpName } from '@/components/harp/harp-name';
import { DueWords } from '@/components/orders/due-words';
import { RegistrationStateMark } from '@/components/orders/registration-state-mark';
import { ARRIVAL_WORDS } from '@/lib/domain/door/arrival-states';
import type { PersonDetails } from '@/lib/domain/people/person-details';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayInstant } from '@/lib/domain/shared/say-date';
import { OrderFacts } from './order-facts';

type PersonFactsProps = { person: PersonDetails; campId: string; timeZone: string; mayReadNeeds: boolean };

/** Who it is, what they chose and own, and the order they stand on. Needs are a page of their own. */
export function PersonFacts({ person, campId, timeZone, mayReadNeeds }: PersonFactsProps) {
  const { currency } = person;
  return (
    <div className="grid gap-6">
      <dl className="grid gap-x-6 gap-y-2 sm:grid-cols-[9rem_1fr]">
        <Fact word="State">
          <RegistrationStateMark state={person.state} />
        </Fact>
        <Fact word="Arrival">
          {ARRIVAL_WORDS[person.arrival]}
          {person.arrivedAt !== null && (
            <>
              , <time>{sayInstant(person.arrivedAt, timeZone)}</time>
            </>
          )}
        </Fact>
        <Fact word="Track">{person.track}</Fact>
        <Fact word="Electives">{person.electives.join(', ') || 'none'}</Fact>
        <Fact word="Harps owned">
          {person.harps.length > 0 ? <HarpName>{person.harps.join(', ')}</HarpName> : 'none'}
        </Fact>
        <Fact word="E-mail">
          <a href={`mailto:${encodeURIComponent(person.email)}`} className="break-all">
            {person.email}
          </a>
        </Fact>
        {person.minor && <Fact word="Age">Under age: a guardian’s consent is needed</Fact>}
        <Fact word="Registered">
          <time>{sayInstant(person.registeredAt, timeZone)}</time>
        </Fact>
      </dl>
      {mayReadNeeds && (
        // A plain link: fetching it beforehand would note a look that nobody took.
        <p>
          <a
            href={`/organise/camps/${campId}/people/${person.id}/needs`}
            className="inline-flex min-h-target items-center"
          >
            Diet, access, emergency contact
          </a>
          <span className="block text-small text-soft">Each look is noted with your name.</span>
        </p>
      )}
      <section aria-labelledby="order" className="border-t-2 border-ink pt-4">
        <h2 id="order" className="text-h3">
          Order <span className="figures">{person.reference}</span>
        </h2>
        <dl className="mt-2 grid gap-x-6 gap-y-2 sm:grid-cols-[9rem_1fr]">
          <Fact word="State">
            <RegistrationStateMark state={person.orderState} />
          </Fact>
          <Fact word="Payer">
            <span className="break-words">{person.payer}</span>,{' '}
            <a href={`mailto:${encodeURIComponent(person.payerEmail)}`} className="break-all">
              {person.payerEmail}
            </a>
          </Fact>
          <Fact word="Total">
            <span className="figures">{formatMoney(person.total, currency)}</span>
          </Fact>
          <Fact word="Paid">
            <span className="figures">{formatMoney(person.paid, currency)}</span>
          </Fact>
          <Fact word="Due">
            <DueWords due={person.due} currency={currency} />
          </Fact>
          {person.others.length > 0 && (
            <Fact word="Also for">
              {person.others.map(({ id, name }) => (
                <Link
                  key={id}
                  prefetch={false}
                  href={`/organise/camps/${campId}/people/${id}` as Route}
                  className="mr-4 inline-flex min-h-8 items-center"
                >
                  {name}
                </Link>
              ))}
            </Fact>
          )}
        </dl>
        <OrderFacts person={person} />
      </section>
    </div>
  );
}

function Fact({ word, children }: { word: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-soft">{word}</dt>
      <dd className="min-w-0 font-semibold">{children}</dd>
    </>
  );
}
