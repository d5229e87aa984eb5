import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import session from 'express-session';
import type { RequestHandler } from 'express';
import type { SessionCard, SessionDevice, SessionHelping } from '../db/entities/session.entity.js';
import type { AppContext } from './context.js';
import { SessionStore } from './session-store.js';

declare module 'express-session' {
  interface SessionData {
    /** Said once, at the sign-in: when it was and what the browser called itself. */
    device?: SessionDevice;
    /** The card that opened it, and the one village that it opens. */
    card?: SessionCard;
    helping?: SessionHelping;
  }
}

const LIFETIME_MS = KEPT_DAYS.session * 24 * 60 * 60 * 1000;

/** Behind https the name itself makes browsers refuse a cookie that another host of the domain has set. */
export function sessionCookieName(secure: boolean): string {
  return `${secure ? '__Host-' : ''}dawnpeg.session`;
}

/** Sessions in the database behind a cookie that scripts cannot read. */
export function sessions({ dataSource, config, clock }: AppContext): RequestHandler {
  return session({
    name: sessionCookieName(config.secureCookies),
    secret: config.sessionSecret,
    store: new SessionStore(dataSource, clock),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    proxy: config.trustProxy > 0,
    cookie: { httpOnly: true, sameSite: 'lax', secure: config.secureCookies, maxAge: LIFETIME_MS, path: '/' },
  });
}
