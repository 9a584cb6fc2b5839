import { readStartOptions } from './options.cjs';

describe('readStartOptions', () => {
  it('serves the seeded demo on 4300 when nothing is said', () => {
    expect(readStartOptions([], {})).toEqual({ reset: false, seed: true, help: false, port: 4300 });
  });

  it('reads every option', () => {
    expect(readStartOptions(['--reset', '--no-seed', '--port', '4400', '--help'], {})).toEqual({
      reset: true,
      seed: false,
      help: true,
      port: 4400,
    });
    expect(readStartOptions(['--port=4401'], {}).port).toBe(4401);
  });

  it('takes the port of the environment, unless one is given', () => {
    expect(readStartOptions([], { SEAMWRIGHT_PORT: '5000' }).port).toBe(5000);
    expect(readStartOptions(['--port', '5001'], { SEAMWRIGHT_PORT: '5000' }).port).toBe(5001);
  });

  it.each([['0'], ['65536'], ['43a'], ['-1'], ['4300.5'], ['']])(
    'refuses the port "%s" and shows the usage',
    (port) => {
      expect(() => readStartOptions(['--port', port], {})).toThrow(/--port must be a port from 1 to 65535[\s\S]*Usage/);
    },
  );

  it('refuses a port that is missing and a word it does not know', () => {
    expect(() => readStartOptions(['--port'], {})).toThrow('--port must be a port');
    expect(() => readStartOptions(['--rest'], {})).toThrow('"--rest" is not understood');
    expect(() => readStartOptions([], { SEAMWRIGHT_PORT: 'http' })).toThrow('SEAMWRIGHT_PORT must be a port');
  });
});
