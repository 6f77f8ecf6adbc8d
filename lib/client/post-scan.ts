import type { ScanAnswer } from '@/lib/domain/door/scan-answer';
import type { ScanInput } from '@/lib/schemas/scan';

type Unmade<T> = T extends unknown ? Omit<T, 'id' | 'deviceAt'> : never;

/** Gives a scan the id that makes sending it again harmless. */
export const makeScan = (scan: Unmade<ScanInput>): ScanInput => ({
  ...scan,
  id: crypto.randomUUID(),
  deviceAt: Date.now(),
});

export type SentScan = { ok: true; answer: ScanAnswer } | { ok: false; sentence: string; again: boolean };

/** Sends one scan. `again` says that the same scan may be sent again: it may or may not have arrived. */
export async function postScan(campId: string, scan: ScanInput): Promise<SentScan> {
  try {
    const response = await fetch(`/api/door/${campId}/scans`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(scan),
      signal: AbortSignal.timeout(8000),
    });
    if (response.ok) return { ok: true, answer: (await response.json()) as ScanAnswer };
    const problem = (await response.json().catch(() => null)) as {
      detail?: string;
      errors?: Record<string, string[]>;
    } | null;
    const field = Object.values(problem?.errors ?? {})[0]?.[0];
    return {
      ok: false,
      sentence: field ?? problem?.detail ?? 'The server refused this.',
      again: response.status >= 500,
    };
  } catch {
    return {
      ok: false,
      sentence: 'No answer from the server. Nothing is lost: send it again when there is signal.',
      again: true,
    };
  }
}
