import 'server-only';
import { unstable_rethrow } from 'next/navigation';
import type { z } from 'zod';
import type { Permission } from '@/lib/domain/access/permissions';
import type { Result } from '@/lib/domain/shared/result';
import type { TargetKind } from './access/find-target';
import type { Refusal } from './errors';
import { brokenBy, type Context, climb, isRefusal } from './ladder';
import { requestId } from './peer-address';
import { problem } from './problem';
import type { Budget } from './rate-limit';
import { readRawBody } from './read-raw-body';

type Params = Record<string, string>;
type Spec<Schema extends z.ZodType> = {
  /** Checks `{ params, query, body }` in one; `body` is the JSON of a POST. */
  schema: Schema;
  permission: Permission;
  /** The kind of row, and the path parameter that holds its id. */
  on?: { kind: TargetKind; param: string };
  rate?: Budget;
  /** Largest JSON body in bytes. */
  limit?: number;
  run: (
    input: z.output<Schema>,
    context: Context,
  ) => Result<Response, Refusal> | Promise<Result<Response, Refusal>>;
};

export type Handler = ((request: Request, at: { params: Promise<Params> }) => Promise<Response>) & {
  access: { permission: Permission; on: TargetKind | null };
};

/** Wraps a use-case as a route handler: the same ladder as `action`, with problem details for errors. */
export function route<Schema extends z.ZodType>(spec: Spec<Schema>): Handler {
  const handle = async (request: Request, at: { params: Promise<Params> }): Promise<Response> => {
    const params = await at.params;
    const reads = request.method === 'GET' || request.method === 'HEAD';
    const id = requestId(request.headers);
    try {
      // Inside as well: a full disk shows here first, where the budget is written down.
      const climbed = await climb(request.headers, {
        permission: spec.permission,
        on: spec.on && { kind: spec.on.kind, id: params[spec.on.param] ?? '' },
        rate: spec.rate ?? (reads ? 'read' : 'edit'),
        sameOrigin: !reads,
      });
      if (isRefusal(climbed)) return problem(climbed, id);
      const body = reads ? undefined : await readJson(request, spec.limit ?? 64 * 1024);
      if (body && 'code' in body) return problem(body, id);
      const query = Object.fromEntries(new URL(request.url).searchParams);
      const parsed = spec.schema.safeParse({ params, query, body: body?.json });
      if (!parsed.success) return problem(toRefusal(parsed.error), id);
      const result = await spec.run(parsed.data, climbed);
      return result.ok ? result.value : problem(result.error, id);
    } catch (error) {
      unstable_rethrow(error);
      return problem(brokenBy(error, id), id);
    }
  };
  return Object.assign(handle, { access: { permission: spec.permission, on: spec.on?.kind ?? null } });
}

function toRefusal(error: z.ZodError): Refusal {
  const fields: Record<string, string[]> = {};
  for (const issue of error.issues) {
    // Leaves out the first step (params, query or body): the caller knows where it put the value.
    const name = issue.path.slice(1).join('.') || String(issue.path[0] ?? 'body');
    fields[name] = [...(fields[name] ?? []), issue.message];
  }
  return { code: 'bad_input', fields };
}

async function readJson(request: Request, limit: number): Promise<{ json: unknown } | Refusal> {
  const text = await readRawBody(request, limit);
  if (text === null)
    return { code: 'too_large', sentence: `That is more than ${limit} bytes, the most this takes.` };
  try {
    return { json: text === '' ? undefined : JSON.parse(text) };
  } catch {
    return { code: 'bad_input', fields: { body: ['The body is not JSON.'] } };
  }
}
