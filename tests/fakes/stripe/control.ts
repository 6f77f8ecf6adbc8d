import { z } from 'zod';
import type { Mock } from './mock';

export class ControlError extends Error {
  constructor(
    readonly status: number,
    message: string,
  ) {
    super(message);
  }
}

export type Input = Record<string, unknown>;
/** One switch: takes JSON or a form and answers JSON. */
export type Control = {
  method: 'GET' | 'POST' | 'DELETE';
  path: RegExp;
  run: (mock: Mock, input: Input, id: string) => unknown;
};

export const count = (fallback: number) => z.coerce.number().int().min(0).max(1000).default(fallback);
export const flag = z.union([z.boolean(), z.enum(['true', 'false']).transform((word) => word === 'true')]);

export function read<S extends z.ZodType>(schema: S, input: Input): z.output<S> {
  const parsed = schema.safeParse(input);
  if (parsed.success) return parsed.data;
  const [issue] = parsed.error.issues;
  throw new ControlError(400, `${issue?.path.join('.') || 'body'}: ${issue?.message ?? 'not understood'}`);
}
