import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import type { SessionPerson } from '@seamwright/identity/contracts/session';

/** What people do about their sign-in, and the application's start. */
export const SessionActions = createActionGroup({
  source: 'Session',
  events: {
    'Application Started': emptyProps(),
    'Sign In Opened': emptyProps(),
    'Sign In Submitted': props<{ email: string; password: string }>(),
    'Sign Out Asked': emptyProps(),
    Renamed: props<{ name: string }>(),
  },
});

/** What the server said of it. */
export const SessionApiActions = createActionGroup({
  source: 'Session API',
  events: {
    Restored: props<{ person: SessionPerson | null }>(),
    'Restore Failed': props<{ problem: Problem }>(),
    'Signed In': props<{ person: SessionPerson }>(),
    'Sign In Refused': props<{ problem: Problem }>(),
    Renewed: props<{ person: SessionPerson }>(),
    Ended: emptyProps(),
    'Signed Out': emptyProps(),
    'Sign Out Failed': props<{ problem: Problem }>(),
  },
});
