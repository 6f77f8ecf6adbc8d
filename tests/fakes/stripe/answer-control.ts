import type { IncomingMessage, ServerResponse } from 'node:http';
import { sendPage } from '../web/page';
import { readBody } from '../web/read-body';
import { sendJson } from '../web/send-json';
import { ControlError } from './control';
import { controlPage } from './control-page';
import { controls } from './controls';
import type { Mock } from './mock';
import { problemPage } from './pay-pages';

async function readInput(req: IncomingMessage, isForm: boolean): Promise<Record<string, unknown>> {
  const text = await readBody(req);
  if (isForm) return Object.fromEntries(new URLSearchParams(text));
  if (text === '') return {};
  try {
    const input = JSON.parse(text);
    if (typeof input === 'object' && input !== null && !Array.isArray(input)) return input;
  } catch {
    // said below
  }
  throw new ControlError(400, 'The body must be a JSON object or a form.');
}

/** /_mock and what lies under it. A form from the page is answered with the page, a program with JSON. */
export async function answerControl(
  mock: Mock,
  req: IncomingMessage,
  res: ServerResponse,
  url: URL,
): Promise<void> {
  if (req.method === 'GET' && /^\/_mock\/?$/.test(url.pathname)) {
    sendPage(res, 200, controlPage(mock));
    return;
  }
  const isForm = (req.headers['content-type'] ?? '').startsWith('application/x-www-form-urlencoded');
  try {
    const input = await readInput(req, isForm);
    for (const control of controls) {
      const match = control.method === req.method ? control.path.exec(url.pathname) : null;
      if (!match) continue;
      const result = await control.run(mock, input, decodeURIComponent(match[1] ?? ''));
      if (isForm) res.writeHead(303, { location: '/_mock' }).end();
      else sendJson(res, 200, result);
      return;
    }
    throw new ControlError(404, `Nothing at ${req.method} ${url.pathname}.`);
  } catch (error) {
    if (!(error instanceof ControlError)) throw error;
    if (isForm) sendPage(res, error.status, problemPage(error.message));
    else sendJson(res, error.status, { error: error.message });
  }
}
