import { describeDevice } from './device-words';

describe('describeDevice', () => {
  it.each([
    ['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Linux'],
    ['Mozilla/5.0 (Windows NT 10.0) AppleWebKit/537.36 Chrome/140.0 Safari/537.36 Edg/140.0', 'Edge on Windows'],
    ['Mozilla/5.0 (iPhone; CPU iPhone OS 19_0 like Mac OS X) Version/19.0 Mobile Safari/604.1', 'Safari on iOS'],
    ['curl/8', 'Another browser'],
  ])('says %s in short', (userAgent, words) => {
    expect(describeDevice(userAgent)).toBe(words);
  });
});
