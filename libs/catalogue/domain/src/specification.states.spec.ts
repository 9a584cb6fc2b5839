import { mayApprove, specificationStates, stageOf, type VersionMove, type VersionStage } from './specification.states';

const STAGES: readonly VersionStage[] = ['draft', 'in-review', 'current', 'superseded', 'withdrawn'];
const MOVES: readonly VersionMove[] = ['submit', 'send-back', 'approve', 'supersede', 'withdraw'];

describe('the life of a specification version', () => {
  it('allows these moves and no other', () => {
    const allowed = STAGES.flatMap((stage) =>
      MOVES.flatMap((move) => {
        const next = specificationStates.next(stage, move);
        return next.ok ? [`${stage} –${move}→ ${next.value}`] : [];
      }),
    );
    expect(allowed).toEqual([
      'draft –submit→ in-review',
      'in-review –send-back→ draft',
      'in-review –approve→ current',
      'current –supersede→ superseded',
      'current –withdraw→ withdrawn',
    ]);
  });

  it('is approved by anybody but its author, from review only', () => {
    const inReview = { state: 'in-review', standing: null, authoredBy: 'ada' } as const;
    expect(mayApprove(inReview, 'ben')).toEqual({ ok: true, value: 'current' });
    expect(mayApprove(inReview, 'ada')).toMatchObject({ refusal: { code: 'own-version' } });
    expect(mayApprove({ ...inReview, state: 'draft' }, 'ben')).toMatchObject({ refusal: { code: 'move-not-allowed' } });
  });

  it('stands where its standing says, once approved', () => {
    expect(stageOf({ state: 'draft', standing: null })).toBe('draft');
    expect(stageOf({ state: 'approved', standing: 'withdrawn' })).toBe('withdrawn');
  });
});
