import type { PersonView } from '@seamwright/identity/contracts';
import { presentReach } from '../session/signed-in.presenter';
import type { PersonRecord } from './people.repository';

export const presentPerson = (person: PersonRecord): PersonView => ({
  id: person.id,
  rowVersion: person.rowVersion,
  email: person.email,
  name: person.name,
  roles: [...person.roles],
  customerId: person.customerId,
  customerName: person.customerName,
  sites: presentReach(person.sites),
  customers: presentReach(person.customers),
  state: person.state,
  lastSeenAt: person.lastSeenAt?.toISOString() ?? null,
});
