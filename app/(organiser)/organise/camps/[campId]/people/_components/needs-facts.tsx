import { sayInstant } from '@/lib/domain/shared/say-date';

type NeedsFactsProps = {
  needs: {
    diet: string;
    access: string;
    emergencyName: string;
    emergencyPhone: string;
    guardianName: string;
    guardianEmail: string;
    guardianPhone: string;
    consentAt: number | null;
  };
  minor: boolean;
  timeZone: string;
};

export function NeedsFacts({ needs, minor, timeZone }: NeedsFactsProps) {
  const consent =
    needs.consentAt === null ? 'Not given: cannot be marked arrived' : sayInstant(needs.consentAt, timeZone);
  const facts: [string, string][] = [
    ['Diet and allergies', needs.diet],
    ['Access', needs.access],
    ['In an emergency', [needs.emergencyName, needs.emergencyPhone].filter(Boolean).join(', ')],
  ];
  if (minor)
    facts.push(
      ['Guardian', [needs.guardianName, needs.guardianPhone, needs.guardianEmail].filter(Boolean).join(', ')],
      ['Guardian’s consent', consent],
    );
  return (
    <dl className="grid max-w-prose gap-x-6 gap-y-3 sm:grid-cols-[12rem_1fr]">
      {facts.map(([word, said]) => (
        <div key={word} className="contents">
          <dt className="text-soft">{word}</dt>
          <dd className="min-w-0 whitespace-pre-line break-words font-semibold">{said || 'nothing given'}</dd>
        </div>
      ))}
    </dl>
  );
}
