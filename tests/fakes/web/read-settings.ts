import { z } from 'zod';

/** Reads settings from the environment; ends the process with one sentence for each that is wrong. */
export function readSettings<S extends z.ZodObject>(schema: S, what: string): z.infer<S> {
  const parsed = schema.safeParse(process.env);
  if (parsed.success) return parsed.data;
  for (const issue of parsed.error.issues)
    console.error(`${what}: ${issue.path.join('.')}: ${issue.message}`);
  process.exit(1);
}

export const portSetting = (fallback: number) =>
  z.coerce
    .number('is a port number, 0 to 65535')
    .int('is a port number, 0 to 65535')
    .min(0, 'is a port number, 0 to 65535')
    .max(65_535, 'is a port number, 0 to 65535')
    .default(fallback);
