import { ok, refuse, type Result } from './result';

/** For each state, the moves it allows and where each leads. A state without moves is an end. */
export type Moves<State extends string, Move extends string> = {
  readonly [From in State]: { readonly [M in Move]?: State };
};

export interface StateTable<State extends string, Move extends string> {
  /** The state after a move. Refuses with `move-not-allowed` (from, move) what the table doesn't hold. */
  next(state: State, move: Move): Result<State>;
  /** The moves that a state allows, in the table's order. */
  allowedMoves(state: State): readonly Move[];
}

/** A state machine as one table; any move that isn't in it is refused. */
export function stateTable<State extends string, Move extends string>(
  table: Moves<State, Move>,
): StateTable<State, Move> {
  return {
    next(state, move) {
      const to = Object.hasOwn(table[state], move) ? table[state][move] : undefined;
      return to === undefined ? refuse('move-not-allowed', { from: state, move }) : ok(to);
    },
    allowedMoves(state) {
      return Object.keys(table[state]) as Move[];
    },
  };
}
