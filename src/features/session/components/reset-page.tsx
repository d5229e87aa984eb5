import { useState } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { paths } from '#src/lib/paths.js';
import { useSession } from '#src/lib/session.js';
import { AskForResetForm } from './ask-for-reset-form.js';
import { NewPasswordForm } from './new-password-form.js';

/** For somebody who has forgotten their password: asks for a letter, or takes the link of one. */
export function ResetPage() {
  const { hash } = useLocation();
  const { person } = useSession();
  const [token] = useState(() => new URLSearchParams(hash.replace(/^#/u, '')).get('token'));
  if (token !== null && token !== '') return <NewPasswordForm token={token} />;
  if (person !== null) return <Navigate to={paths.today()} replace />;
  return <AskForResetForm />;
}
