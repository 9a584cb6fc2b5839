import { knownAddresses, publishAddresses } from './addresses';
import { startStack } from './running-stack';

/** Starts the stack before the first test and gives what stops it after the last. */
export default async function globalSetup(): Promise<(() => Promise<void>) | undefined> {
  // Somebody who writes a test may keep one stack running and name it.
  if (knownAddresses()) return undefined;
  const adminUrl = process.env['SEAMWRIGHT_TEST_ADMIN_URL'];
  if (!adminUrl) {
    throw new Error('SEAMWRIGHT_TEST_ADMIN_URL is not set: run these tests by npm test -- --only browser');
  }
  const stack = await startStack(adminUrl);
  publishAddresses(stack.addresses);
  return stack.stop;
}
