import type { Diagram } from './schema';

interface Broken {
	readonly path: (string | number)[];
	readonly message: string;
}

/**
 * What of a document names something that is not there, or contradicts itself. Loops are no part of it: they can be
 * drawn, and `evaluate` names them.
 */
export function brokenReferences(document: Diagram): Broken[] {
	const broken: Broken[] = [];
	const report = (message: string, ...path: (string | number)[]): void => void broken.push({ path, message });
	const paths = new Set(document.paths.map(({ id }) => id));
	const stations = new Map(document.stations.map((station) => [station.id, station]));
	const fed = new Set<string>();
	const ids = new Set<string>();

	for (const list of ['paths', 'stations', 'processes'] as const)
		document[list].forEach(({ id }, i) => {
			if (ids.has(id)) report('The id is used twice.', list, i, 'id');
			ids.add(id);
		});
	document.paths.forEach(({ airflow }, i) => {
		if (airflow.kind === 'volume' && airflow.stationId !== null && !stations.has(airflow.stationId))
			report('There is no such station.', 'paths', i, 'airflow', 'stationId');
	});
	document.processes.forEach((process, i) => {
		const { pathId, inletIds, outletId } = process;
		if (!paths.has(pathId)) report('There is no such path.', 'processes', i, 'pathId');
		inletIds.forEach((id, k) => {
			if (!stations.has(id)) report('There is no such station.', 'processes', i, 'inletIds', k);
		});
		if (new Set(inletIds).size < inletIds.length)
			report('Both inlets are the same station.', 'processes', i, 'inletIds');
		if (stations.get(outletId)?.source.kind !== 'process')
			report('The outlet is no station that a process produces.', 'processes', i, 'outletId');
		if (fed.has(outletId)) report('Another process produces this station.', 'processes', i, 'outletId');
		fed.add(outletId);
	});
	document.stations.forEach(({ id, pathId, source }, i) => {
		if (!paths.has(pathId)) report('There is no such path.', 'stations', i, 'pathId');
		if (source.kind === 'process' && !fed.has(id)) report('No process produces this station.', 'stations', i, 'source');
	});
	return broken;
}
