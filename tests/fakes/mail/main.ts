import { z } from 'zod';
import { endOnSignal } from '../web/end-on-signal';
import { portSetting, readSettings } from '../web/read-settings';
import { startMailServer } from './start-mail-server';

const settings = readSettings(
  z.object({
    MAIL_SMTP_PORT: portSetting(2525),
    MAIL_WEB_PORT: portSetting(8025),
    MAIL_STATE: z.string().min(1).optional(),
  }),
  'mail-server',
);

const mail = await startMailServer({
  smtpPort: settings.MAIL_SMTP_PORT,
  webPort: settings.MAIL_WEB_PORT,
  stateFolder: settings.MAIL_STATE,
}).catch((error: unknown) => {
  console.error(`mail-server: ${error instanceof Error ? error.message : String(error)}`);
  process.exit(1);
});
console.log(`Local mail server: read at ${mail.url}, takes mail at ${mail.smtpUrl}`);
endOnSignal(mail.close);
