import 'server-only';
import { nextStep } from '@/lib/domain/camp/next-step';
import { publishChecklist } from '@/lib/domain/camp/publish-checklist';
import { localDay } from '@/lib/domain/shared/local-time';
import type { CampLine } from './list-camps';
import { loadProgramme } from './load-programme';

/** What is next for each camp that has something next, by id. Only drafts are read whole, for their checklist. */
export function listNextSteps(camps: readonly CampLine[], now: number): Map<string, string> {
  const steps = new Map<string, string>();
  for (const camp of camps) {
    const today = localDay(now, camp.timeZone);
    const programme = camp.state === 'draft' ? loadProgramme(camp.id) : null;
    const step = nextStep(camp, programme ? publishChecklist(programme, today) : [], today);
    if (step) steps.set(camp.id, step);
  }
  return steps;
}
