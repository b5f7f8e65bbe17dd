import { describe, expect, it } from 'vitest';
import { addStation } from './commands/addStation';
import { evaluate } from './evaluate';
import { newDiagram } from './newDiagram';
import { openDocument, openDocumentText } from './open';
import { siteOf } from './site';

const empty = newDiagram({ pathId: 'p1', system: 'SI' });
const site = siteOf({ elevation: { value: 1800, unit: 'm' }, measuredPressure: null, relations: 'ideal' });
const situation = { evaluated: evaluate(empty, site), system: 'SI' as const };

describe('openDocument', () => {
	it('opens a new diagram as it was kept', () => {
		expect(openDocumentText(JSON.stringify(empty))).toEqual({ ok: true, diagram: empty });
	});
	it.each([
		['notJson', '{'],
		['notADiagram', '{"version":1}'],
		['tooNew', JSON.stringify({ ...empty, version: 2 })],
		['invalid', JSON.stringify({ ...empty, paths: [] })],
		[
			'invalid',
			JSON.stringify({ ...empty, stations: [{ id: 's', pathId: 'gone', name: '', source: { kind: 'process' } }] })
		]
	])('refuses as %s: %s', (code, text) => {
		expect(openDocumentText(text)).toMatchObject({ ok: false, error: { code } });
	});
});

describe('addStation', () => {
	it('gives a dropped station by dry bulb and relative humidity near the place, and leaves the old document alone', () => {
		const done = addStation(
			empty,
			{ stationId: 's1', pathId: 'p1', at: { dryBulb: 24, humidityRatio: 0.009 } },
			situation
		);
		expect(done).toMatchObject({ ok: true, label: 'add station 1', itemId: 's1' });
		expect(empty.stations).toHaveLength(0);
		if (!done.ok) return;
		expect(openDocument(done.diagram).ok).toBe(true);
		const state = evaluate(done.diagram, site).station('s1')?.state;
		expect(state?.dryBulb).toBeCloseTo(24, 1);
		expect(state?.humidityRatio).toBeCloseTo(0.009, 4);
	});
	it('refuses an impossible pair in the words of the units, and a path that is gone', () => {
		const pair = [
			{ property: 'dryBulb' as const, given: { value: 40, unit: 'degC' as const } },
			{ property: 'wetBulb' as const, given: { value: 5, unit: 'degC' as const } }
		];
		expect(addStation(empty, { stationId: 's1', pathId: 'p1', at: pair }, situation)).toMatchObject({
			ok: false,
			code: 'belowDryAir'
		});
		expect(
			addStation(empty, { stationId: 's1', pathId: 'p9', at: { dryBulb: 24, humidityRatio: 0.009 } }, situation)
		).toMatchObject({
			ok: false,
			code: 'pathGone'
		});
	});
});
