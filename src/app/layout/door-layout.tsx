import { Outlet } from 'react-router-dom';
import { Frame } from './frame.js';

/** Screens before the door: no rail. */
export function DoorLayout() {
  return (
    <Frame rail={null}>
      <Outlet />
    </Frame>
  );
}
