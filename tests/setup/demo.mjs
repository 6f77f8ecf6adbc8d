import { DEMO_PASSWORD, SIGN_INS } from '../../db/seed/demo-sign-ins.mjs';
import { ensureBuilt, ensureInstalled, ensureSeeded, places, stackEnv, startStack } from './stack.mjs';

// `npm run demo` runs the production build; `npm run dev` is the same with reload. `--fresh` starts over.
const reload = process.argv.includes('--reload');
const fresh = process.argv.includes('--fresh');
const port = Number(process.env.PORT ?? 3000);
const folder = 'data/demo';

try {
  if (!Number.isInteger(port) || port < 1024 || port > 65000)
    throw new Error(`PORT is ${process.env.PORT}: give a number from 1024 to 65000.`);
  ensureInstalled();
  if (!reload) ensureBuilt();
  const env = stackEnv(port, folder);
  ensureSeeded(folder, env, fresh);
  const { stop } = await startStack(port, env, { reload });
  const at = places(port);
  const width = Math.max(...SIGN_INS.map(({ role }) => role.length));
  console.log(`
Combwood runs at         ${at.app}
Mails are read at        ${at.mail}
Payments are watched at  ${at.pay}

Sign in at ${at.app}/sign-in, every password: ${DEMO_PASSWORD}
${SIGN_INS.map(({ role, email }) => `  ${role.padEnd(width)}  ${email}`).join('\n')}

Ctrl-C ends all of it.`);
  let ending = false;
  for (const signal of ['SIGINT', 'SIGTERM'])
    process.on(signal, async () => {
      if (ending) return;
      ending = true;
      await stop();
      process.exit(0);
    });
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
}
