import type { Request, Response } from 'express';
import { decode } from 'jsonwebtoken';
import { Passport } from 'passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import type { Caller } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { accessClaims, callerOf, keyIdOf } from './access-token';

const bearerOf = ExtractJwt.fromAuthHeaderAsBearerToken();

/** Tells who asks by the access token of a request: null without one; refuses a wrong or old one as `not-signed-in`. */
export function authenticateBearer({ jwtSecrets }: { readonly jwtSecrets: readonly string[] }) {
  const secrets = new Map(jwtSecrets.map((secret) => [keyIdOf(secret), secret]));
  const passport = new Passport();
  passport.use(
    new Strategy(
      {
        jwtFromRequest: bearerOf,
        algorithms: ['HS256'],
        secretOrKeyProvider: (_request, token: string, done) => {
          const secret = secrets.get(decode(token, { complete: true })?.header.kid ?? '');
          done(secret ? null : new RefusalError({ code: 'not-signed-in', params: {} }), secret);
        },
      },
      (payload: unknown, done) => {
        const claims = accessClaims.safeParse(payload);
        done(null, claims.success ? callerOf(claims.data) : false);
      },
    ),
  );

  return (request: Request): Promise<Caller | null> =>
    new Promise((resolve, reject) => {
      if (bearerOf(request) === null) return resolve(null);
      const refuse = () => reject(new RefusalError({ code: 'not-signed-in', params: {} }));
      const judged = (error: unknown, caller: Caller | false) => (error || !caller ? refuse() : resolve(caller));
      const check = passport.authenticate('jwt', { session: false }, judged);
      // A callback is given, so passport writes no answer of its own.
      check(request, {} as Response, refuse);
    });
}
