import type { GeoPermissibleObjects } from 'd3-geo';
import { feature } from 'topojson-client';

/**
 * Land by Natural Earth (public domain), from npm world-atlas, in two grades; the fine one only where somebody looks
 * closely. No borders: they help nobody to find a village.
 */
type Topology = Parameters<typeof feature>[0];
type LandTopology = Topology & { objects: { land: Topology['objects'][string] } };

export async function coarseLand(): Promise<GeoPermissibleObjects> {
  return shapeOf((await import('world-atlas/land-110m.json')).default);
}

export async function fineLand(): Promise<GeoPermissibleObjects> {
  return shapeOf((await import('world-atlas/land-50m.json')).default);
}

function shapeOf(json: unknown): GeoPermissibleObjects {
  const topology = json as LandTopology;
  return feature(topology, topology.objects.land);
}
