import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describes, problemsOfAnswer, problemsOfObject, publishedOperations } from './testing/published-description';
import { KEY, startMock } from './testing/running-mock';

const fixtures = JSON.parse(readFileSync(join(__dirname, 'openapi', 'fixtures.json'), 'utf8')) as Record<
  string,
  Record<string, unknown>
>;

describe('the check against the published description', () => {
  it.each(Object.keys(fixtures))('accepts the published sample of a %s', (name) => {
    expect(problemsOfObject(name, fixtures[name])).toEqual([]);
  });

  it('finds what is missing, of the wrong type or not among the published words', () => {
    const sample = fixtures['payment_intent'];
    expect(problemsOfObject('payment_intent', { ...sample, amount: '10.99' })).toContain('/amount must be integer');
    expect(problemsOfObject('payment_intent', { ...sample, status: 'held' })).not.toEqual([]);
    const withoutId = { ...sample };
    delete withoutId['id'];
    expect(problemsOfObject('payment_intent', withoutId)).toContain(" must have required property 'id'");
  });

  it('knows answers by their address', () => {
    const path = '/v1/payment_intents/pi_1/capture';
    expect(problemsOfAnswer('POST', path, 200, fixtures['payment_intent'])).toEqual([]);
    expect(problemsOfAnswer('POST', path, 200, fixtures['charge'])).not.toEqual([]);
    expect(describes('GET', '/v1/nothing')).toBe(false);
  });
});

/** A card's refund can't be canceled, and disputes are not played. */
const leftOut = (operation: string) => operation.includes('/v1/disputes') || operation.endsWith('/{refund}/cancel');

it('all published operations but the ones left out on purpose are answered', async () => {
  const running = await startMock();
  const unknown: string[] = [];
  for (const operation of publishedOperations) {
    const [method = '', path = ''] = operation.split(' ');
    const url = `${running.url}${path.replaceAll(/[{}]/g, '')}`;
    const answer = (await (await fetch(url, { method, headers: { Authorization: `Bearer ${KEY}` } })).json()) as {
      error?: { message: string };
    };
    if (answer.error?.message.startsWith('Unrecognized request URL')) unknown.push(operation);
  }
  await running.close();
  expect(unknown).toEqual(publishedOperations.filter(leftOut));
  expect(running.violations).toEqual([]);
});
