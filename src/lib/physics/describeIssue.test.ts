import { describe, expect, it } from 'vitest';
import { airState } from './air/airState';
import { describeRefusal } from './describeIssue';

describe('describeRefusal', () => {
	const messageOf = (result: ReturnType<typeof airState>, system: 'SI' | 'IP') =>
		result.ok ? '' : describeRefusal(result.refusal, system).fact;

	it('names field, value and bound in the units of the project', () => {
		const impossible = airState({ dryBulb: 40, wetBulb: 5 }, 101.325);
		expect(messageOf(impossible, 'SI')).toMatch(/^Wet bulb 5\.0\u2009°C .* lowest possible is \d+\.\d\u2009°C\.$/);
		expect(messageOf(impossible, 'IP')).toMatch(/^Wet bulb 41\.0\u2009°F/);
		expect(messageOf(airState({ dryBulb: 20, relativeHumidity: 1.2 }, 101.325), 'SI')).toBe(
			'Relative humidity lies between 0.0\u2009% and 100.0\u2009%.'
		);
	});
	it('names the unit a pressure was most likely meant in', () => {
		expect(messageOf(airState({ dryBulb: 20, relativeHumidity: 0.5 }, 1013.25), 'SI')).toContain(
			'1\u2009013.25\u2009kPa'
		);
	});
});
