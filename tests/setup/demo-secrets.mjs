/** Known to everyone and refused outside demo mode. */
export const DEMO_SECRETS = {
  COMBWOOD_MODE: 'demo',
  AUTH_SECRET: 'demo-auth-secret-for-local-use-only-000000',
  TICKET_SEED: Buffer.from('combwood-demo-ticket-key-0000000').toString('base64url'),
  STRIPE_SECRET_KEY: 'sk_test_demo_combwood',
  STRIPE_WEBHOOK_SECRET: 'whsec_demo_combwood',
  MAIL_FROM_NAME: 'Slate Ridge Harp Society',
  MAIL_FROM_ADDRESS: 'camps@slateridge.example',
};
