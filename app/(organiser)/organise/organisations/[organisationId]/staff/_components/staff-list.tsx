import { ActionForm } from '@/components/forms/action-form';
import { Instant } from '@/components/ui/instant';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import type { StaffPerson } from '@/lib/server/staff/list-staff';
import { revokeRoleAction } from '../actions';

type StaffListProps = { people: readonly StaffPerson[]; organisationId: OrganisationId };

export function StaffList({ people, organisationId }: StaffListProps) {
  return (
    <ul aria-label="Staff" className="border-t border-line">
      {people.map((person) => (
        <li
          key={person.id}
          className="grid gap-x-8 gap-y-2 border-b border-line py-4 md:grid-cols-[minmax(0,1fr)_minmax(0,1.4fr)]"
        >
          <div className="min-w-0">
            <p className="break-words font-semibold">{person.name}</p>
            <p className="wrap-anywhere text-small text-soft">{person.email}</p>
          </div>
          <ul aria-label={`Roles of ${person.name}`} className="grid gap-1">
            {person.roles.map(({ membershipId, role, since }) => (
              <li key={membershipId}>
                <details>
                  <summary className="flex min-h-target flex-wrap items-center justify-between gap-x-6">
                    <span>
                      {ROLE_WORDS[role]}
                      <span className="block text-small text-soft">
                        since <Instant at={since} />
                      </span>
                    </span>
                    <span className="text-lake underline underline-offset-4">
                      Take away
                      <span className="sr-only">
                        : {ROLE_WORDS[role]}, {person.name}
                      </span>
                    </span>
                  </summary>
                  <div className="border-l-4 border-reed py-2 pl-4">
                    <p className="mb-3">
                      From that moment {person.name} is no longer {ROLE_WORDS[role].toLowerCase()} here. You
                      can invite them again later.
                    </p>
                    <ActionForm
                      action={revokeRoleAction}
                      submit="Take the role away"
                      submitLabel={`Take the role away: ${ROLE_WORDS[role]}, ${person.name}`}
                      tone="danger"
                      hidden={{ organisationId, membershipId }}
                    />
                  </div>
                </details>
              </li>
            ))}
          </ul>
        </li>
      ))}
    </ul>
  );
}
