import * as contracts from '@seamwright/identity/contracts';
import { implement, type Implementation } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { changePassword, endMySession, getMe, listMySessions, renameMe, signOutEverywhere } from './own-account';

export const accountRouter = (parts: IdentityParts): Implementation[] => [
  implement(contracts.getMe, (context) => getMe(context)),
  implement(contracts.renameMe, (context, { body }) => renameMe(context, body.name)),
  implement(contracts.listSessions, (context) => listMySessions(parts, context)),
  implement(contracts.endSession, (context, { params }) => endMySession(parts, context, params.sessionId)),
  implement(contracts.signOutEverywhere, (context) => signOutEverywhere(parts, context)),
  implement(contracts.changePassword, (context, { body }) => changePassword(parts, context, body)),
];
