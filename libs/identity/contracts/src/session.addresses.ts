import type { CallAddress } from '@seamwright/shared/contracts';

// Where the calls go that every start of an application makes. Their shapes stand with the endpoints: whoever sends them
// needs no zod.
const anyone = { who: 'anyone' } as const;

export const signInAddress = { method: 'POST', path: '/session', access: anyone } as const satisfies CallAddress;

export const refreshAddress = {
  method: 'POST',
  path: '/session/refresh',
  access: anyone,
} as const satisfies CallAddress;

export const signOutAddress = { method: 'DELETE', path: '/session', access: anyone } as const satisfies CallAddress;
