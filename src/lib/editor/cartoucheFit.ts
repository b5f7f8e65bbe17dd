import type { Projection } from '$lib/chart/types';
import type { EvaluatedDiagram } from '$lib/diagram/evaluated';
import { saturationHumidityRatio } from '$lib/physics/air/moistAir';
import type { Point } from '$lib/scene/types';
import { processLine } from './hitTest';

/** How much of the cartouche the empty corner holds, most first. */
export const CARTOUCHE_SIZES = [
	{ part: 'key', width: 250, height: 330 },
	{ part: 'ledger', width: 250, height: 190 },
	{ part: 'title', width: 250, height: 76 }
] as const;
export type CartouchePart = (typeof CARTOUCHE_SIZES)[number]['part'];

/** The enthalpy bar with its figures runs this far outside saturation. */
const BAR_ROOM = 58;

/** The largest form of the cartouche that covers neither chart nor path; null where the corner is needed. */
export function cartoucheFit(evaluated: EvaluatedDiagram, projection: Projection, origin: Point): CartouchePart | null {
	const fits = CARTOUCHE_SIZES.find(({ width, height }) => {
		const corner = { x: origin.x + width, y: origin.y + height };
		return isAboveChart(corner, evaluated, projection) && !pathEnters(corner, evaluated, projection);
	});
	return fits?.part ?? null;
}

// The corner nearest to the chart decides: saturation only rises to the right.
function isAboveChart(corner: Point, evaluated: EvaluatedDiagram, projection: Projection): boolean {
	const { dryBulb, humidityRatio } = projection.toChart({ x: corner.x + BAR_ROOM, y: corner.y + BAR_ROOM });
	const { pressureKPa } = evaluated.site;
	return humidityRatio > saturationHumidityRatio(dryBulb, pressureKPa);
}

function pathEnters(corner: Point, evaluated: EvaluatedDiagram, projection: Projection): boolean {
	const lines = evaluated.processes.flatMap((p) => processLine(evaluated, p.id));
	const states = evaluated.stations.flatMap((s) => (s.state ? [s.state] : []));
	return [...lines, ...states].some((point) => {
		const { x, y } = projection.toScene(point);
		return x < corner.x + 16 && y < corner.y + 16 && x > projection.plot.x && y > projection.plot.y;
	});
}
