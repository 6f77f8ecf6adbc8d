import 'server-only';
import type { ReactElement } from 'react';
import type { MailAddress } from '@/lib/domain/mail/mail-address';

export type LetterPart = {
  filename: string;
  content: Buffer | string;
  contentType: string;
  /** Shown inside the letter where it names `cid:` and this. */
  cid?: string;
};

/** A message before it is rendered: what a loader makes of a row's payload. */
export type Letter = {
  subject: string;
  body: ReactElement;
  replyTo?: MailAddress;
  parts?: LetterPart[];
};

export type LetterInput = { payload: Record<string, string>; toName: string; now: number };
export type LoadLetter = (input: LetterInput) => Letter | Promise<Letter>;
