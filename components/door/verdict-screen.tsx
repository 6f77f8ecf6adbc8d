'use client';

import { useEffect, useRef, useState } from 'react';
import { VERDICT_WORDS } from '@/lib/domain/door/decide-arrival';
import type { ScanAnswer } from '@/lib/domain/door/scan-answer';
import { UndoForm } from './undo-form';
import { VerdictShape } from './verdict-shape';

const GROUND = { tick: 'bg-moss', ring: 'bg-lake', cross: 'bg-reed', bar: 'bg-lake' };

type VerdictScreenProps = {
  answer: ScanAnswer;
  onNext: () => void;
  /** Takes the arrival back; resolves to a sentence when it could not. */
  onUndo: (reason: string) => Promise<string | null>;
};

/** Fills the screen with one word and one shape; below it who, track, what is due, and the next thing to do. */
export function VerdictScreen({ answer, onNext, onUndo }: VerdictScreenProps) {
  const { word, shape, next } = VERDICT_WORDS[answer.verdict];
  const head = useRef<HTMLHeadingElement>(null);
  const [undoing, setUndoing] = useState(false);
  useEffect(() => {
    head.current?.focus();
  }, []);
  const { person } = answer;
  const mayUndo = person !== null && (answer.verdict === 'arrived' || answer.verdict === 'already');

  return (
    <section
      className={`fixed inset-0 z-40 flex flex-col overflow-y-auto text-board ${GROUND[shape]}`}
      aria-label="Verdict"
    >
      <div className="flex flex-1 flex-col items-center justify-center gap-3 px-4 py-6 text-center">
        <VerdictShape shape={shape} />
        <div role="alert">
          <h2
            ref={head}
            tabIndex={-1}
            className="font-head text-[clamp(3.2rem,15vw,9rem)] font-extrabold leading-none outline-none"
          >
            {word}
          </h2>
        </div>
        {person && <p className="break-words font-head text-h1">{person.name}</p>}
        {person && <p className="text-lead">{person.track}</p>}
        {answer.verdict === 'already' && person?.arrivedAt && (
          <p className="text-lead">
            at <time>{person.arrivedAt}</time>
            {person.arrivedBy && ` by ${person.arrivedBy}`}
          </p>
        )}
        {answer.otherCamp && <p className="text-lead">{answer.otherCamp}</p>}
        <ul className="grid gap-1 text-lead font-semibold">
          {person?.due && <li>Due: {person.due}</li>}
          {person?.minor && <li>Under 18: ask for the guardian</li>}
          {person?.hasNeeds && <li>Has a diet or access note: tell the organiser they are here</li>}
        </ul>
        <p>{next}</p>
      </div>
      <div className="grid gap-3 bg-board p-4 text-ink">
        {undoing ? (
          <UndoForm onUndo={onUndo} onCancel={() => setUndoing(false)} />
        ) : (
          <>
            <button
              type="button"
              onClick={onNext}
              className="min-h-16 w-full rounded border-2 border-on-brass bg-brass text-h3 font-bold text-on-brass"
            >
              Next
            </button>
            {mayUndo && (
              <button
                type="button"
                onClick={() => setUndoing(true)}
                className="min-h-target w-full rounded border-2 border-edge font-semibold"
              >
                Take it back
              </button>
            )}
          </>
        )}
      </div>
    </section>
  );
}
