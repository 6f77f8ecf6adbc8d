/** The least that Next can be: what our own server is measured against. Copied under data/ and built there. */
export default {
  poweredByHeader: false,
  turbopack: { root: process.env.BENCH_ROOT },
  outputFileTracingRoot: process.env.BENCH_ROOT,
};
