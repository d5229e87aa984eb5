import { geoEquirectangular, type GeoProjection } from 'd3-geo';

/** What of the Earth is on screen: its middle, and how near. 1 shows the whole width of the Earth. */
export interface MapView {
  longitudeDeg: number;
  latitudeDeg: number;
  zoom: number;
}

export interface EarthPoint {
  latitudeDeg: number;
  longitudeDeg: number;
}

export const WHOLE_EARTH: MapView = { longitudeDeg: 20, latitudeDeg: 10, zoom: 1 };
export const ZOOM_MAX = 128;
/** Nearer than this the fine coastline is worth its weight. */
export const FINE_FROM_ZOOM = 6;
/** A place that is known already is shown with its wider neighbourhood. */
const NEAR_ZOOM = 8;

const TURN_DEG = 360;

/** Plate carrée: a degree is as wide as it is high, so that any place is as easily hit as another. */
export function mapProjection(view: MapView, widthPx: number, heightPx: number): GeoProjection {
  return geoEquirectangular()
    .rotate([-view.longitudeDeg, 0])
    .center([0, view.latitudeDeg])
    .scale((widthPx * view.zoom) / (2 * Math.PI))
    .translate([widthPx / 2, heightPx / 2])
    .clipExtent([
      [-8, -8],
      [widthPx + 8, heightPx + 8],
    ]);
}

export function viewOf(point: EarthPoint | null): MapView {
  return point === null ? WHOLE_EARTH : { ...point, zoom: NEAR_ZOOM };
}

/** Moves the view by pixels, as a finger drags the paper. */
export function panned(view: MapView, dx: number, dy: number, widthPx: number): MapView {
  const degPerPx = TURN_DEG / (widthPx * view.zoom);
  return {
    ...view,
    longitudeDeg: wrapped(view.longitudeDeg - dx * degPerPx),
    latitudeDeg: Math.min(85, Math.max(-85, view.latitudeDeg + dy * degPerPx)),
  };
}

export function zoomed(view: MapView, factor: number): MapView {
  return { ...view, zoom: Math.min(ZOOM_MAX, Math.max(1, view.zoom * factor)) };
}

/** The place under a point that is counted in pixels from the picture's middle; as fine as a finger can mean it. */
export function placeAt(view: MapView, x: number, y: number, widthPx: number): EarthPoint {
  const degPerPx = TURN_DEG / (widthPx * view.zoom);
  const decimals = Math.max(0, Math.min(3, Math.ceil(-Math.log10(degPerPx))));
  const round = (value: number) => Number(value.toFixed(decimals)) + 0;
  return {
    latitudeDeg: round(Math.min(90, Math.max(-90, view.latitudeDeg - y * degPerPx))),
    longitudeDeg: round(wrapped(view.longitudeDeg + x * degPerPx)),
  };
}

function wrapped(longitudeDeg: number): number {
  return ((((longitudeDeg + 180) % TURN_DEG) + TURN_DEG) % TURN_DEG) - 180;
}
