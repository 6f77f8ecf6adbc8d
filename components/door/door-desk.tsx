'use client';

import { useCallback, useRef, useState } from 'react';
import { makeScan, postScan } from '@/lib/client/post-scan';
import { playVerdict } from '@/lib/client/verdict-sound';
import { VERDICT_WORDS } from '@/lib/domain/door/decide-arrival';
import type { ScanAnswer } from '@/lib/domain/door/scan-answer';
import type { ScanInput } from '@/lib/schemas/scan';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { CameraScanner } from './camera-scanner';
import { NameSearch } from './name-search';
import { VerdictScreen } from './verdict-screen';

const SOUNDS = { tick: 'in', ring: 'look', cross: 'stop', bar: 'look' } as const;

type DoorDeskProps = { campId: string; confirmed: number; arrived: number };
type Unsent = { scan: ScanInput; sentence: string; again: boolean };

/** The door on a phone: camera or name, then one verdict, then the next person. */
export function DoorDesk({ campId, confirmed, arrived: arrivedAtOpen }: DoorDeskProps) {
  const [answer, setAnswer] = useState<ScanAnswer | null>(null);
  const [unsent, setUnsent] = useState<Unsent | null>(null);
  const [sending, setSending] = useState(false);
  const [arrived, setArrived] = useState(arrivedAtOpen);
  // A ref, as two camera frames may both be read before React has rendered once.
  const busy = useRef(false);

  const send = useCallback(
    async (scan: ScanInput): Promise<string | null> => {
      busy.current = true;
      setSending(true);
      const sent = await postScan(campId, scan);
      setSending(false);
      if (!sent.ok) {
        if (scan.kind !== 'undo') setUnsent({ scan, sentence: sent.sentence, again: sent.again });
        return sent.sentence;
      }
      setUnsent(null);
      setAnswer(sent.answer);
      playVerdict(SOUNDS[VERDICT_WORDS[sent.answer.verdict].shape]);
      if (sent.answer.verdict === 'arrived') setArrived((count) => count + 1);
      if (sent.answer.verdict === 'undone') setArrived((count) => count - 1);
      return null;
    },
    [campId],
  );
  const onCode = useCallback(
    (code: string) => {
      if (!busy.current) void send(makeScan({ kind: 'ticket', code }));
    },
    [send],
  );
  const rest = (): void => {
    setAnswer(null);
    setUnsent(null);
    busy.current = false;
  };

  return (
    <div className="grid gap-6">
      <p className="text-lead">
        <span className="figures font-bold">{arrived}</span> of <span className="figures">{confirmed}</span>{' '}
        are in
      </p>
      {unsent && (
        <Notice tone="stop" title="Not recorded yet" live>
          <p>{unsent.sentence}</p>
          <div className="mt-3 flex flex-wrap gap-3">
            {unsent.again && (
              <Button tone="primary" onClick={() => void send(unsent.scan)} aria-disabled={sending}>
                Send it again
              </Button>
            )}
            <Button onClick={rest}>Leave it</Button>
          </div>
        </Notice>
      )}
      <CameraScanner onCode={onCode} paused={answer !== null || unsent !== null || sending} />
      <NameSearch
        campId={campId}
        onPick={(registrationId) => void send(makeScan({ kind: 'name', registrationId }))}
      />
      {answer && (
        <VerdictScreen
          key={`${answer.verdict}${answer.person?.registrationId}`}
          answer={answer}
          onNext={rest}
          onUndo={async (reason) =>
            answer.person
              ? send(makeScan({ kind: 'undo', registrationId: answer.person.registrationId, reason }))
              : null
          }
        />
      )}
    </div>
  );
}
