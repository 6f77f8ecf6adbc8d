import { z } from 'zod';
import { endOnSignal } from '../web/end-on-signal';
import { portSetting, readSettings } from '../web/read-settings';
import { startStripeMock } from './start-stripe-mock';

const settings = readSettings(
  z.object({
    STRIPE_MOCK_PORT: portSetting(4242),
    STRIPE_MOCK_URL: z.url().optional(),
    STRIPE_MOCK_WEBHOOK_URL: z.url().optional(),
    STRIPE_MOCK_WEBHOOK_SECRET: z.string().startsWith('whsec_').optional(),
    STRIPE_MOCK_STATE: z.string().min(1).optional(),
    STRIPE_MOCK_MERCHANT: z.string().min(1).max(80).optional(),
  }),
  'stripe-mock',
);

const mock = await startStripeMock({
  port: settings.STRIPE_MOCK_PORT,
  webhookUrl: settings.STRIPE_MOCK_WEBHOOK_URL,
  webhookSecret: settings.STRIPE_MOCK_WEBHOOK_SECRET,
  stateFile: settings.STRIPE_MOCK_STATE,
  publicUrl: settings.STRIPE_MOCK_URL,
  merchant: settings.STRIPE_MOCK_MERCHANT,
}).catch((error: unknown) => {
  console.error(`stripe-mock: ${error instanceof Error ? error.message : String(error)}`);
  process.exit(1);
});
console.log(`Stand-in for Stripe: ${mock.url}/_mock (no money moves)`);
endOnSignal(mock.close);
