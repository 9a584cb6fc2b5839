import type { Implementation } from '@seamwright/shared/server';
import { accountRouter } from './account/account.router';
import { customersRouter } from './customers/customers.router';
import type { IdentityParts } from './identity-parts';
import { linksRouter } from './links/links.router';
import { peopleRouter } from './people/people.router';
import { sessionRouter } from './session/session.router';

/** Everything that the storey answers. */
export const identityImplementations = (parts: IdentityParts): Implementation[] => [
  ...sessionRouter(parts),
  ...accountRouter(parts),
  ...linksRouter(parts),
  ...peopleRouter(parts),
  ...customersRouter(parts),
];
