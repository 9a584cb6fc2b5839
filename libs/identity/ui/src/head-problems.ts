import type { FieldProblem, ProblemText } from '@seamwright/shared/ui';

/** What stands at the head of a form: what belongs to no field, or the problem itself when it names no field at all. */
export function headProblems(problem: ProblemText, homeless: readonly FieldProblem[]): readonly FieldProblem[] {
  if (homeless.length > 0) return homeless;
  return problem.errors?.length ? [] : [{ pointer: '', message: problem.detail ?? problem.title }];
}
