import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { projectionOf } from './projection';

const frame = { width: 1040, height: 652, textScale: 1, detail: 'full' } as const;
const range = { dryBulbMin: 0, dryBulbMax: 40, humidityRatioMin: 0, humidityRatioMax: 0.02 };

describe('projectionOf', () => {
	it('puts the corners of the range on the corners of the plot, temperature right and water up', () => {
		const { plot, toScene } = projectionOf(frame, range);
		expect(toScene({ dryBulb: 0, humidityRatio: 0 })).toEqual({ x: plot.x, y: plot.y + plot.height });
		expect(toScene({ dryBulb: 40, humidityRatio: 0.02 })).toEqual({ x: plot.x + plot.width, y: plot.y });
	});
	it('is undone by toChart', () => {
		const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
		fc.assert(
			fc.property(number(-40, 90), number(0, 0.1), (dryBulb, humidityRatio) => {
				const { toScene, toChart } = projectionOf(frame, range);
				const back = toChart(toScene({ dryBulb, humidityRatio }));
				expect(back.dryBulb).toBeCloseTo(dryBulb, 9);
				expect(back.humidityRatio).toBeCloseTo(humidityRatio, 9);
			})
		);
	});
});
