import { Link, useLocation, type LinkProps } from 'react-router-dom';
import { paths } from '#src/lib/paths.js';
import { useStarTableFacts } from './star-table-context.js';

/** The way to a star's page. It takes the list's address along, so that the way back leads to the list as it was. */
export function StarLink({ markerKey, ...link }: Omit<LinkProps, 'to' | 'state'> & { markerKey: string }) {
  const { placeId, year } = useStarTableFacts();
  const { pathname, search } = useLocation();
  return <Link {...link} to={paths.star(markerKey, { placeId, year })} state={{ list: pathname + search }} />;
}
