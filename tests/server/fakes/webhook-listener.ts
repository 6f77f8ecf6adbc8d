import { createServer } from 'node:http';
import Stripe from 'stripe';
import { closeServer, listenLocally } from '@/tests/fakes/web/listen-locally';
import { readBody } from '@/tests/fakes/web/read-body';

export const webhookSecret = 'whsec_listener_of_the_tests';

/** An endpoint that checks each webhook with the SDK's own verifier; `status` decides what it answers. */
export async function listenForWebhooks() {
  const got: Stripe.Event[] = [];
  const refused: string[] = [];
  const listener = { got, refused, status: 200, url: '', close: async () => {} };
  const server = createServer(async (req, res) => {
    const body = await readBody(req);
    try {
      const event = Stripe.webhooks.constructEvent(
        body,
        String(req.headers['stripe-signature']),
        webhookSecret,
      );
      if (listener.status < 300) got.push(event);
      res.writeHead(listener.status).end();
    } catch (error) {
      refused.push(String(error));
      res.writeHead(400).end();
    }
  });
  const port = await listenLocally(server, 0);
  listener.url = `http://127.0.0.1:${port}/webhook`;
  listener.close = () => closeServer(server);
  return listener;
}
