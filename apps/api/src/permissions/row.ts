import type { AnyEndpoint, CallInput } from '@seamwright/shared/contracts';
import type { Caller } from '@seamwright/shared/server';
import type { Party } from './testing/party';
import type { World } from './testing/world';

/** What is sent: a file is its bytes and name. */
export type Input<E extends AnyEndpoint> = Omit<CallInput<E>, 'file'> & {
  readonly file?: { readonly bytes: Buffer; readonly name: string };
};
export type AnyInput = Input<AnyEndpoint> & { readonly ifMatch?: number };

type Ready<E extends AnyEndpoint> = Promise<Input<E>> | Input<E>;

/** What a caller who doesn't serve the customer gets: not found, or a list with nothing in it. */
export type Hidden = 'not-found' | 'empty';

/** One row of the permission matrix: how to call an endpoint rightly. A deed is made ready anew for each right call. */
export type Row =
  | {
      readonly endpoint: AnyEndpoint;
      readonly belongsTo: 'customer';
      readonly hidden: Hidden;
      input(world: World, party: Party): Promise<AnyInput> | AnyInput;
    }
  | {
      readonly endpoint: AnyEndpoint;
      readonly belongsTo: 'caller';
      /** Whoever serves no customer at all has nothing of the kind. */
      readonly needsCustomer: boolean;
      input(world: World, caller: Caller): Promise<AnyInput> | AnyInput;
    }
  | {
      readonly endpoint: AnyEndpoint;
      readonly belongsTo: 'house';
      input(world: World): Promise<AnyInput> | AnyInput;
    };

/** What is asked for belongs to one customer. */
export const ofCustomer = <E extends AnyEndpoint>(
  endpoint: E,
  input: (world: World, party: Party) => Ready<E>,
  hidden: Hidden = 'not-found',
): Row => ({ endpoint, belongsTo: 'customer', hidden, input: input as (world: World, party: Party) => AnyInput });

/** It is the caller's own, whoever calls: nobody else's can be named. */
export const ofCaller = <E extends AnyEndpoint>(
  endpoint: E,
  input: (world: World, caller: Caller) => Ready<E>,
  { needsCustomer = false } = {},
): Row => ({
  endpoint,
  belongsTo: 'caller',
  needsCustomer,
  input: input as (world: World, caller: Caller) => AnyInput,
});

/** It belongs to no customer. */
export const ofHouse = <E extends AnyEndpoint>(endpoint: E, input: (world: World) => Ready<E>): Row => ({
  endpoint,
  belongsTo: 'house',
  input: input as (world: World) => AnyInput,
});
