import { z } from 'zod';

/**
 * refuse: answer `code` at a step of the SMTP talk. cut: drop the connection at that step; after `data` the message is
 * kept and only the answer is lost, which is what a sender sees when the network breaks between send and confirm.
 */
export const faultSchema = z.strictObject({
  kind: z.enum(['refuse', 'cut']).default('refuse'),
  step: z.enum(['connect', 'mail', 'rcpt', 'data']).default('rcpt'),
  code: z.coerce.number().int().min(400, 'is 400 to 599').max(599, 'is 400 to 599').default(451),
  message: z
    .string()
    .max(200)
    .regex(/^[^\r\n]*$/, 'is one line')
    .default('Refused because a test asked for it'),
  count: z.coerce.number().int().min(1).max(100_000).default(1),
  /** Only for recipients whose address holds this; for steps rcpt and data. */
  to: z.string().max(254).optional(),
});

export type MailFault = z.output<typeof faultSchema>;

export class MailFaults {
  readonly waiting: MailFault[] = [];

  /** Uses up one fault set for this step, if any fits. */
  take(step: MailFault['step'], recipients: string[] = []): MailFault | undefined {
    const at = this.waiting.findIndex(
      (fault) =>
        fault.step === step && (!fault.to || recipients.some((address) => address.includes(fault.to ?? ''))),
    );
    const fault = this.waiting[at];
    if (!fault) return undefined;
    if (fault.count > 1) this.waiting[at] = { ...fault, count: fault.count - 1 };
    else this.waiting.splice(at, 1);
    return fault;
  }
}
