declare module 'autocannon' {
  type Result = { requests: { total: number }; non2xx: number; errors: number; timeouts: number };
  export default function autocannon(options: {
    url: string;
    connections: number;
    /** Seconds. */
    duration: number;
  }): Promise<Result>;
}
