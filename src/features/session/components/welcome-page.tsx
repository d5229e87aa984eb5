import { useState } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { paths } from '#src/lib/paths.js';
import { useSession } from '#src/lib/session.js';
import { readWelcomeHash } from '../model/welcome-hash.js';
import { FirstStewardForm } from './first-steward-form.js';
import { RedeemCodeForm } from './redeem-code-form.js';

/** The way in for somebody without a password: a one-time code, or the link of the very first start. */
export function WelcomePage() {
  const { hash } = useLocation();
  const { person } = useSession();
  // Kept from the first look: signing in on the way must not change the form under the person's hands.
  const [link] = useState(() => readWelcomeHash(hash));
  if (person !== null) return <Navigate to={paths.today()} replace />;
  if (link.firstSteward !== null) return <FirstStewardForm token={link.firstSteward} />;
  return <RedeemCodeForm code={link.code ?? ''} />;
}
