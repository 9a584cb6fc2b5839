import { v7 } from 'uuid';

/** An identifier of one kind of thing (`Id<'Order'>`), a UUID as text; kinds don't mix. */
export type Id<Name extends string> = string & { readonly __id: Name };

/** A new identifier: UUID version 7 (RFC 9562), which sorts by the time it was made. */
export function newId<Name extends string>(): Id<Name> {
  return v7() as Id<Name>;
}
