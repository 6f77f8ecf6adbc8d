declare module 'autocannon' {
  type Request = { method?: string; path?: string; headers?: Record<string, string>; body?: string };
  type Options = {
    url: string;
    connections: number;
    duration?: number;
    amount?: number;
    headers?: Record<string, string>;
    requests?: (Request & { setupRequest?: (request: Request) => Request })[];
  };
  type Result = {
    requests: { total: number };
    /** Seconds. */
    duration: number;
    non2xx: number;
    errors: number;
    timeouts: number;
  };
  export default function autocannon(options: Options): Promise<Result>;
}
