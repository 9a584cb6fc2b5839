import { hasWords } from '@seamwright/shared/contracts';
import { RefusalError } from '@seamwright/shared/util';
import { conflict, notFound, problemOf, ProblemError } from './problems';

describe('problemOf', () => {
  it('puts a refusal into words, with the field it points at', () => {
    const problem = problemOf(
      new RefusalError({ code: 'invalid', params: {}, pointer: '/lines/0/pieces' }),
      '/api/v1/orders',
    );
    expect(problem).toMatchObject({
      status: 422,
      code: 'invalid',
      type: '/problems/invalid',
      instance: '/api/v1/orders',
    });
    expect(problem.errors).toEqual([{ pointer: '/lines/0/pieces', message: problem.detail }]);
  });

  it.each([
    [notFound(), 404],
    [conflict('in-use'), 409],
    [new ProblemError(422, { code: 'key-reused', params: {} }), 422],
    [new RefusalError({ code: 'stale', params: {} }), 412],
    [Object.assign(new Error('duplicate'), { code: '23505', severity: 'ERROR', constraint: 'people_email' }), 409],
    [Object.assign(new Error('check'), { code: '23514', severity: 'ERROR' }), 422],
    [Object.assign(new Error('range'), { code: '22003', severity: 'ERROR' }), 422],
  ])('answers %s with its status', (error, status) => {
    const problem = problemOf(error, '/');
    expect(problem.status).toBe(status);
    expect(hasWords(problem.code)).toBe(true);
  });

  it('says nothing of the inside when we failed', () => {
    const problem = problemOf(new Error('relation "people" does not exist'), '/');
    expect(problem.status).toBe(500);
    expect(JSON.stringify(problem)).not.toContain('people');
  });
});
