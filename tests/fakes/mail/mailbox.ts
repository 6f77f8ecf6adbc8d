import { randomBytes } from 'node:crypto';
import {
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

export type Envelope = { from: string; to: string[] };

/** What the list needs, so that it never parses a message. */
export type MessageSummary = {
  id: string;
  receivedAt: string;
  envelope: Envelope;
  subject: string;
  from: string;
  to: string[];
  messageId: string | null;
  attachments: number;
  size: number;
};

/**
 * Messages as files, <id>.eml as it came in and <id>.json with its summary. The summary is written last, by rename:
 * a message is there whole or not at all. Without a folder they live in a temporary one that goes at the end.
 */
export class Mailbox {
  private readonly folder: string;
  private readonly temporary: boolean;
  private readonly summaries = new Map<string, MessageSummary>();
  private waiting: (() => void)[] = [];

  constructor(folder?: string) {
    this.temporary = folder === undefined;
    this.folder = folder ?? mkdtempSync(join(tmpdir(), 'mail-'));
    mkdirSync(this.folder, { recursive: true });
    for (const name of readdirSync(this.folder).sort()) {
      if (!name.endsWith('.json')) continue;
      const summary = JSON.parse(readFileSync(join(this.folder, name), 'utf8')) as MessageSummary;
      this.summaries.set(summary.id, summary);
    }
  }

  /** Newest first; `to` finds a part of a recipient's address, of the envelope or the header. */
  list(to = ''): MessageSummary[] {
    const wanted = to.trim().toLowerCase();
    return [...this.summaries.values()]
      .filter(
        ({ envelope, to: header }) =>
          wanted === '' ||
          [...envelope.to, ...header].some((address) => address.toLowerCase().includes(wanted)),
      )
      .reverse();
  }

  get(id: string): MessageSummary | undefined {
    return this.summaries.get(id);
  }

  raw(id: string): Buffer | null {
    return this.summaries.has(id) ? readFileSync(join(this.folder, `${id}.eml`)) : null;
  }

  add(raw: Buffer, rest: Omit<MessageSummary, 'id' | 'receivedAt' | 'size'>): MessageSummary {
    const at = new Date();
    // Sorts by time of arrival, so that a restart lists them in the same order.
    const id = `${at.getTime().toString(36).padStart(9, '0')}${String(this.summaries.size % 10_000).padStart(4, '0')}${randomBytes(3).toString('hex')}`;
    const summary = { ...rest, id, receivedAt: at.toISOString(), size: raw.length };
    writeFileSync(join(this.folder, `${id}.eml`), raw);
    writeFileSync(join(this.folder, `${id}.json.new`), JSON.stringify(summary, null, 2));
    renameSync(join(this.folder, `${id}.json.new`), join(this.folder, `${id}.json`));
    this.summaries.set(id, summary);
    this.wake();
    return summary;
  }

  remove(id: string): boolean {
    if (!this.summaries.delete(id)) return false;
    rmSync(join(this.folder, `${id}.json`), { force: true });
    rmSync(join(this.folder, `${id}.eml`), { force: true });
    return true;
  }

  clear(): number {
    const ids = [...this.summaries.keys()];
    for (const id of ids) this.remove(id);
    return ids.length;
  }

  /** Resolves when a message comes in or after `ms`. */
  change(ms: number): Promise<void> {
    return new Promise((resolve) => {
      const timer = setTimeout(resolve, ms);
      this.waiting.push(() => {
        clearTimeout(timer);
        resolve();
      });
    });
  }

  close(): void {
    this.wake();
    if (this.temporary) rmSync(this.folder, { recursive: true, force: true });
  }

  private wake(): void {
    const waiting = this.waiting;
    this.waiting = [];
    for (const go of waiting) go();
  }
}
