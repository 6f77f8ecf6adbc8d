import { spendEmailToken } from '@/lib/server/auth/email-tokens';
import { inTransaction } from '@/lib/server/db';

// One of several processes that go for the same link: waits for the word, then says whether it got it.
process.stdout.write('ready\n');
process.stdin.once('data', (token) => {
  const got = inTransaction((tx) => spendEmailToken(tx, token.toString().trim(), Date.now()));
  process.stdout.write(got ? 'got\n' : 'none\n');
  process.exit(0);
});
