import type { Diagram, DiagramProcess } from './schema';

/** The process that produces each station, by the station's id. */
export function producers(document: Diagram): Map<string, DiagramProcess> {
	return new Map(document.processes.map((process) => [process.outletId, process]));
}

/** Ids of a path's stations and processes in the order of the air: every inlet before what it feeds. */
export function orderOfPath(document: Diagram, pathId: string): string[] {
	const made = producers(document);
	const order: string[] = [];
	const seen = new Set<string>();
	const visit = (stationId: string): void => {
		if (seen.has(stationId)) return;
		seen.add(stationId);
		const process = made.get(stationId);
		process?.inletIds.forEach(visit);
		if (process?.pathId === pathId) order.push(process.id);
		if (document.stations.some((s) => s.id === stationId && s.pathId === pathId)) order.push(stationId);
	};
	document.stations.filter((s) => s.pathId === pathId).forEach(({ id }) => visit(id));
	return order;
}
