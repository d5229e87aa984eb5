/** What sign-in hands to the next screen: the person has just come in and chose no screen of their own. */
export const ARRIVED = { arrived: true } as const;

/** Is this the state of an address to which sign-in led? */
export function hasArrived(state: unknown): boolean {
  return typeof state === 'object' && state !== null && 'arrived' in state && state.arrived === true;
}
