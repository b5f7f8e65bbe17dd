import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Given } from '$lib/units/quantities';
import { evaluate } from './evaluate';
import { diagramSchema, type Diagram } from './schema';
import { siteOf } from './site';

const given = (value: number, unit: Given['unit']): Given => ({ value, unit });
const site = siteOf({ elevation: given(1800, 'm'), measuredPressure: null, relations: 'ideal' });

/** A path of two heaters in a row, fed by outdoor air. */
function twoHeaters(firstGiven: Record<string, Given>, inletDryBulb = 2): Diagram {
	return diagramSchema.parse({
		format: 'isohume.diagram',
		version: 1,
		subtitle: '',
		notes: '',
		override: {},
		paths: [{ id: 'p', name: 'Winter', airflow: { kind: 'volume', given: given(3600, 'm3/h'), stationId: 's3' } }],
		stations: [
			{
				id: 's1',
				pathId: 'p',
				name: 'Outdoor air',
				source: {
					kind: 'given',
					pair: [
						{ property: 'dryBulb', given: given(inletDryBulb, 'degC') },
						{ property: 'relativeHumidity', given: given(80, 'percent') }
					]
				}
			},
			{ id: 's2', pathId: 'p', name: 'Preheated air', source: { kind: 'process' } },
			{ id: 's3', pathId: 'p', name: 'Supply air', source: { kind: 'process' } }
		],
		processes: [
			{
				id: 'h2',
				pathId: 'p',
				kind: 'sensibleHeating',
				inletIds: ['s2'],
				outletId: 's3',
				given: { temperatureRise: given(10, 'K') }
			},
			{ id: 'h1', pathId: 'p', kind: 'sensibleHeating', inletIds: ['s1'], outletId: 's2', given: firstGiven }
		]
	});
}

describe('evaluate', () => {
	it('solves in the order of the air whatever the order of the document', () => {
		const result = evaluate(twoHeaters({ leavingDryBulb: given(15, 'degC') }), site);
		expect(result.station('s3')?.state?.dryBulb).toBeCloseTo(25, 9);
		expect(result.paths[0]?.order).toEqual(['s1', 'h1', 's2', 'h2', 's3']);
	});

	it('keeps the humidity ratio through both heaters, and the second follows when the first station moves', () => {
		const before = evaluate(twoHeaters({ temperatureRise: given(13, 'K') }, 2), site);
		const after = evaluate(twoHeaters({ temperatureRise: given(13, 'K') }, 4), site);
		expect(before.station('s3')?.state?.humidityRatio).toBe(before.station('s1')?.state?.humidityRatio);
		expect(after.station('s3')?.state?.dryBulb).toBeCloseTo(27, 9);
	});

	it('holds a volume flow at the station it is given for, also one that depends on the flow', () => {
		const result = evaluate(twoHeaters({ duty: given(12, 'kW') }), site);
		expect(result.station('s3')?.volumeM3PerS).toBeCloseTo(1, 9);
		expect(result.process('h1')?.result).toMatchObject({ ok: true });
		const sum = result.processes.reduce((kw, p) => kw + (p.result?.ok ? p.result.duties.total : NaN), 0);
		expect(result.paths[0]?.totalKW).toBeCloseTo(sum, 12);
	});

	it('isolates a failing process: what it feeds says why, the rest is computed', () => {
		const result = evaluate(twoHeaters({ leavingDryBulb: given(-5, 'degC') }), site);
		expect(result.station('s1')?.state).not.toBeNull();
		expect(result.station('s2')).toMatchObject({
			state: null,
			refusal: { code: 'heaterCools', field: 'leavingDryBulb' }
		});
		expect(result.station('s3')?.refusal?.code).toBe('heaterCools');
	});

	it('names a loop', () => {
		const looped = twoHeaters({ temperatureRise: given(1, 'K') });
		looped.processes[1] = { ...looped.processes[1]!, inletIds: ['s3'] };
		expect(evaluate(looped, site).station('s2')?.refusal).toMatchObject({ code: 'loop', field: '2 → 3 → 2' });
	});

	it('takes a pressure of the diagram before the project’s', () => {
		const project = { elevation: given(5905.5, 'ft'), measuredPressure: null, relations: 'ideal' as const };
		expect(siteOf(project).pressureKPa).toBeCloseTo(site.pressureKPa, 4);
		expect(siteOf(project, { pressure: given(29, 'inHg') })).toMatchObject({ pressureFrom: 'diagram' });
	});

	it('never throws on numbers of any kind', () => {
		const number = fc.oneof(
			fc.double(),
			fc.constantFrom(NaN, Infinity, -Infinity, -0),
			fc.double({ min: -40, max: 60 })
		);
		fc.assert(
			fc.property(number, number, fc.constantFrom('leavingDryBulb', 'duty', 'temperatureRise'), (t, x, setting) => {
				const document = twoHeaters({ leavingDryBulb: given(15, 'degC') });
				document.processes[1] = { ...document.processes[1]!, given: { [setting]: given(x, 'one') } };
				const first = document.stations[0]!;
				if (first.source.kind === 'given') first.source.pair[0]!.given = given(t, 'degC');
				const outlet = evaluate(document, site).station('s3');
				expect(outlet?.state !== null || outlet?.refusal !== null).toBe(true);
			}),
			{ numRuns: 500 }
		);
	});
});
