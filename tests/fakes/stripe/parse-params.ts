import { z } from 'zod';
import { type ApiError, badRequest } from './api-error';
import type { FormObject } from './parse-form';

const custom = (message: string, code: string) => ({ message, params: { code } });

export const text = (max = 5000) => z.string().min(1).max(max);

export const integer = (min = Number.MIN_SAFE_INTEGER, max = Number.MAX_SAFE_INTEGER) =>
  z
    .string()
    .regex(/^-?\d{1,15}$/, { message: 'integer' })
    .transform(Number)
    .refine(
      (n) => n >= min,
      custom(`This value must be greater than or equal to ${min}.`, 'parameter_invalid_integer'),
    )
    .refine(
      (n) => n <= max,
      custom(`This value must be less than or equal to ${max}.`, 'parameter_invalid_integer'),
    );

export const flag = z.enum(['true', 'false']).transform((word) => word === 'true');

function isWebUrl(url: string): boolean {
  try {
    return /^https?:$/.test(new URL(url).protocol);
  } catch {
    return false;
  }
}

export const webUrl = z.string().min(1).max(5000).refine(isWebUrl, custom('Not a valid URL', 'url_invalid'));

// Limits of the published API reference, "Metadata": 50 keys, names of 40 and values of 500 characters.
export const metadata = z
  .record(z.string().max(40), z.string().max(500))
  .refine(
    (map) => Object.keys(map).length <= 50,
    custom('Metadata can hold at most 50 keys.', 'parameter_invalid_integer'),
  )
  .transform((map) => Object.fromEntries(Object.entries(map).filter(([, value]) => value !== '')));

export const expandable = { expand: z.array(z.string()).max(20).optional() };

const range = z.strictObject({ gt: integer(), gte: integer(), lt: integer(), lte: integer() }).partial();
export const listed = {
  ...expandable,
  limit: integer(1, 100).optional(),
  starting_after: text().optional(),
  ending_before: text().optional(),
  created: z.union([integer(), range]).optional(),
};

function bracketed(path: readonly PropertyKey[]): string {
  const [head, ...rest] = path.map(String);
  return `${head ?? ''}${rest.map((key) => `[${key}]`).join('')}`;
}

function toApiError(issue: z.core.$ZodIssue): ApiError {
  const param = bracketed(issue.path);
  if (issue.code === 'unrecognized_keys') {
    const unknown = bracketed([...issue.path, issue.keys[0] ?? '']);
    const message = `Received unknown parameter: ${unknown}. If the real API knows it, this stand-in does not yet.`;
    return badRequest(message, { code: 'parameter_unknown', param: unknown });
  }
  if (issue.input === undefined && issue.code !== 'custom')
    return badRequest(`Missing required param: ${param}.`, { code: 'parameter_missing', param });
  if (issue.input === '')
    return badRequest(
      `You passed an empty string for '${param}'. Remove it from your request or supply a non-empty value.`,
      { code: 'parameter_invalid_empty', param },
    );
  if (issue.code === 'custom')
    return badRequest(issue.message, { code: String(issue.params?.code ?? 'parameter_invalid'), param });
  if (issue.message === 'integer')
    return badRequest(`Invalid integer: ${String(issue.input)}`, {
      code: 'parameter_invalid_integer',
      param,
    });
  return badRequest(`Invalid ${param}: ${issue.message}`, { param });
}

/** Reads parameters by a schema or throws the error that the API would answer, naming the parameter in brackets. */
export function parseParams<S extends z.ZodType>(schema: S, form: FormObject): z.output<S> {
  const parsed = schema.safeParse(form, { reportInput: true });
  if (parsed.success) return parsed.data;
  throw toApiError(parsed.error.issues[0] as z.core.$ZodIssue);
}
