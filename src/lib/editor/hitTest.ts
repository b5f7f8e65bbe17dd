import type { Projection } from '$lib/chart/types';
import type { EvaluatedDiagram } from '$lib/diagram/evaluated';
import type { ChartPoint } from '$lib/physics/types';
import type { Point } from '$lib/scene/types';

/** Reach of the pointer in scene units: a finger covers about three times what a mouse points at. */
export const REACH = {
	mouse: { station: 11, process: 8 },
	touch: { station: 22, process: 18 }
} as const;
export type Reach = (typeof REACH)[keyof typeof REACH];

export interface Hit {
	readonly kind: 'station' | 'process';
	readonly id: string;
}

/** The station under a point, else the process; the nearest where several are in reach. */
export function hitTest(evaluated: EvaluatedDiagram, projection: Projection, at: Point, reach: Reach): Hit | null {
	const station = nearest(evaluated.stations, reach.station, (s) =>
		s.state ? distance(projection.toScene(s.state), at) : Infinity
	);
	if (station) return { kind: 'station', id: station.id };
	const process = nearest(evaluated.processes, reach.process, (p) =>
		distanceToLine(processLine(evaluated, p.id), projection, at)
	);
	return process ? { kind: 'process', id: process.id } : null;
}

/** The line of a process on the chart; straight between its stations where the process could not be solved. */
export function processLine(evaluated: EvaluatedDiagram, processId: string): readonly ChartPoint[] {
	const process = evaluated.process(processId);
	if (!process) return [];
	if (process.result?.ok) return process.result.line;
	const ends = [process.inletIds[0], process.outletId].map((id) => (id ? evaluated.station(id)?.state : null));
	return ends.filter((state) => state !== null && state !== undefined);
}

function nearest<T>(items: readonly T[], limit: number, measure: (item: T) => number): T | null {
	let best: T | null = null;
	let least = limit;
	for (const item of items) {
		const d = measure(item);
		if (d <= least) [best, least] = [item, d];
	}
	return best;
}

function distanceToLine(line: readonly ChartPoint[], projection: Projection, at: Point): number {
	const points = line.map((p) => projection.toScene(p));
	let least = Infinity;
	points.forEach((b, i) => {
		const a = points[i - 1];
		if (a) least = Math.min(least, distanceToSegment(a, b, at));
	});
	return least;
}

function distanceToSegment(a: Point, b: Point, p: Point): number {
	const [dx, dy] = [b.x - a.x, b.y - a.y];
	const squared = dx * dx + dy * dy;
	const along = squared === 0 ? 0 : ((p.x - a.x) * dx + (p.y - a.y) * dy) / squared;
	const t = Math.min(1, Math.max(0, along));
	return distance({ x: a.x + t * dx, y: a.y + t * dy }, p);
}

function distance(a: Point, b: Point): number {
	return Math.hypot(a.x - b.x, a.y - b.y);
}
