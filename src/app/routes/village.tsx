import { Navigate } from 'react-router-dom';
import { paths } from '#src/lib/paths.js';

/** The rail leads to the village; its first part is open to everybody there. */
export function Component() {
  return <Navigate to={paths.villagePlaces()} replace />;
}
