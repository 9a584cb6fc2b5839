import type { SessionPerson, SignedIn } from '@seamwright/identity/contracts';
import type { Reach } from '@seamwright/identity/domain';
import type { IdentityParts } from '../identity-parts';
import type { SignedInPerson } from '../people/signed-in-person';
import { ACCESS_TOKEN_SECONDS, signAccessToken } from '../tokens/access-token';

export const presentReach = (reach: Reach): '*' | string[] => (reach === '*' ? '*' : [...reach]);

export const presentSessionPerson = (person: SignedInPerson): SessionPerson => ({
  id: person.id,
  name: person.name,
  email: person.email,
  roles: [...person.roles],
  customerId: person.customerId,
  customerName: person.customerName,
  sites: presentReach(person.sites),
});

/** What somebody is told who has just proved who they are: a new access token among it. */
export const presentSignedIn = ({ jwtSecrets }: IdentityParts, person: SignedInPerson): SignedIn => ({
  accessToken: signAccessToken(jwtSecrets[0], person),
  expiresInSeconds: ACCESS_TOKEN_SECONDS,
  person: presentSessionPerson(person),
});
