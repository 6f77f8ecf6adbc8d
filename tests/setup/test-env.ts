import { DEMO_SECRETS } from './demo-secrets.mjs';

/** The environment that server tests run in: demo secrets, nothing reachable. */
Object.assign(process.env, DEMO_SECRETS, {
  COMBWOOD_DB: ':unset:',
  BASE_URL: 'http://localhost:3000',
  STRIPE_API_URL: 'http://127.0.0.1:9',
  SMTP_URL: 'smtp://127.0.0.1:9',
  LOG_LEVEL: 'silent',
});
