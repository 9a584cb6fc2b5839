import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading } from './remote';

const problem: Problem = { type: '', title: '', status: 0, detail: '', instance: '', code: 'offline', errors: [] };

describe('what a screen knows of the server’s things', () => {
  it('stays in sight while newer is fetched, and when that fails', () => {
    const shown = loaded(['saddle']);
    expect(loading(shown)).toEqual({ status: 'loading', data: ['saddle'], problem: null });
    expect(failed(loading(shown), problem)).toEqual({ status: 'failed', data: ['saddle'], problem });
  });

  it('forgets an old problem as soon as it is asked again', () => {
    expect(loading(failed(idle<string>(), problem))).toEqual({ status: 'loading', data: null, problem: null });
    expect(loaded('saddle').problem).toBeNull();
  });
});
