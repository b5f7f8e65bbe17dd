import type { ChartRange } from '$lib/chart/types';
import type { EvaluatedDiagram, EvaluatedProcess, EvaluatedStation } from '$lib/diagram/evaluated';
import { formatQuantity } from '$lib/units/format';
import type { UnitSystem } from '$lib/units/quantities';

/** A station as read aloud: number, name, its two coordinates. */
export function describeStation(station: EvaluatedStation, system: UnitSystem): string {
	const name = `Station ${station.number}${station.name ? ` ${station.name}` : ''}`;
	if (!station.state) return `${name}, no state`;
	const { dryBulb, humidityRatio } = station.state;
	const origin = station.origin === 'given' ? 'given' : 'derived';
	return `${name}, ${origin}, ${formatQuantity(dryBulb, 'temperature', system)}, ${formatQuantity(humidityRatio, 'humidityRatio', system)}`;
}

/** A process as read aloud: name, stations it joins, its duty. */
export function describeProcess(process: EvaluatedProcess, evaluated: EvaluatedDiagram, system: UnitSystem): string {
	const number = (id: string): string => String(evaluated.station(id)?.number ?? '?');
	const from = process.inletIds.map(number).join(' and ');
	const route = `${process.label} from ${from} to ${number(process.outletId)}`;
	if (!process.result?.ok) return `${route}, not solved`;
	return `${route}, ${formatQuantity(process.result.duties.total, 'power', system, { signed: true })}`;
}

/** The whole chart in a few sentences, for readers who do not see it. */
export function describeChart(evaluated: EvaluatedDiagram, range: ChartRange, system: UnitSystem): string {
	const show = (value: number, quantity: 'temperature' | 'humidityRatio' | 'pressure'): string =>
		formatQuantity(value, quantity, system);
	const sentences = [
		`Psychrometric chart for ${show(evaluated.site.pressureKPa, 'pressure')}`,
		`Dry bulb ${show(range.dryBulbMin, 'temperature')} to ${show(range.dryBulbMax, 'temperature')} across, humidity ratio to ${show(range.humidityRatioMax, 'humidityRatio')} up`
	];
	if (evaluated.stations.length === 0) sentences.push('No stations yet');
	for (const station of evaluated.stations) sentences.push(describeStation(station, system));
	for (const process of evaluated.processes) sentences.push(describeProcess(process, evaluated, system));
	return `${sentences.join('. ')}.`;
}
