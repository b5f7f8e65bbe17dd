import type { Airflow, Diagram, DiagramPath } from '../schema';
import { UNITS, type Quantity } from '$lib/units/quantities';
import { toSI } from '$lib/units/convert';
import { MAX_NAME, tooLong } from './renameItem';
import { noSuchPath, noSuchStation, refuse, refuseAs, type CommandResult, type Situation } from './types';

const QUANTITY: Record<Airflow['kind'], Quantity> = { mass: 'massFlow', volume: 'volumeFlow', standard: 'volumeFlow' };
const MAX_AIRFLOW = 1e5;

/** Gives a path its airflow: by mass of dry air, by volume at a station, or as standard air. */
export function setAirflow(
	diagram: Diagram,
	{ pathId, airflow }: { readonly pathId: string; readonly airflow: Airflow },
	{ system }: Situation
): CommandResult {
	if (!diagram.paths.some(({ id }) => id === pathId)) return noSuchPath;
	if (airflow.kind === 'volume' && airflow.stationId !== null)
		if (!diagram.stations.some(({ id }) => id === airflow.stationId)) return noSuchStation;
	const quantity = QUANTITY[airflow.kind];
	if (UNITS[airflow.given.unit].quantity !== quantity)
		return refuse(
			'airflowUnit',
			`${UNITS[airflow.given.unit].symbol} is no unit of this airflow. Choose another one.`,
			'airflow'
		);
	const value = toSI(airflow.given);
	if (!(value >= 0 && value <= MAX_AIRFLOW))
		return refuseAs({ code: 'airflowRange', field: 'airflow', value, quantity, min: 0, max: MAX_AIRFLOW }, system);
	return { ok: true, diagram: withPath(diagram, pathId, { airflow }), label: 'change the airflow' };
}

export function renamePath(
	diagram: Diagram,
	{ pathId, name }: { readonly pathId: string; readonly name: string }
): CommandResult {
	if (!diagram.paths.some(({ id }) => id === pathId)) return noSuchPath;
	if (name.length > MAX_NAME) return tooLong('The name', name, MAX_NAME);
	return { ok: true, diagram: withPath(diagram, pathId, { name: name.trim() }), label: 'rename path' };
}

function withPath(diagram: Diagram, id: string, change: Partial<Omit<DiagramPath, 'id'>>): Diagram {
	return { ...diagram, paths: diagram.paths.map((path) => (path.id === id ? { ...path, ...change } : path)) };
}
