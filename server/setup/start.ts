/** `npm start`: the whole product, until Ctrl-C. */
import { DEMO_ACCOUNTS } from './demo/accounts';
import { startProduct } from './product';
import { runUntilStopped } from './until-stopped';

runUntilStopped(async ({ onOpened, fail }) => {
  const { url, config } = await startProduct({
    env: process.env,
    withPages: true,
    onProgress: (line) => console.log(line),
    onLost: () => fail('The database ended unexpectedly. Start again: it recovers by itself.'),
    onOpened,
  });
  console.log(`\nPairleaf is ready: ${url}`);
  if (config.mode === 'demo') {
    console.log('\nDemo accounts (they exist in demo mode only):');
    for (const { role, email, password } of DEMO_ACCOUNTS) console.log(`  ${role.padEnd(12)} ${email.padEnd(32)} ${password}`);
  }
  console.log('\nCtrl-C stops the app and its database.');
});
