import { scaleLinear } from 'd3-scale';
import type { ChartFrame, ChartRange, Projection } from './types';

/** Room around the plot for edge scales, figures and the enthalpy bar, in scene units at text scale 1. */
const MARGIN = {
	full: { top: 56, right: 72, bottom: 48, left: 28 },
	reduced: { top: 16, right: 44, bottom: 32, left: 16 },
	thumbnail: { top: 8, right: 8, bottom: 10, left: 8 }
} as const;

/** The projection of a range of the chart into a frame: dry bulb to the right, humidity ratio upwards. */
export function projectionOf(frame: ChartFrame, range: ChartRange): Projection {
	const margin = MARGIN[frame.detail];
	const scale = frame.textScale;
	const plot = {
		x: margin.left * scale,
		y: margin.top * scale,
		width: Math.max(1, frame.width - (margin.left + margin.right) * scale),
		height: Math.max(1, frame.height - (margin.top + margin.bottom) * scale)
	};
	const x = scaleLinear([range.dryBulbMin, range.dryBulbMax], [plot.x, plot.x + plot.width]);
	const y = scaleLinear([range.humidityRatioMin, range.humidityRatioMax], [plot.y + plot.height, plot.y]);
	return {
		range,
		frame,
		plot,
		toScene: ({ dryBulb, humidityRatio }) => ({ x: x(dryBulb), y: y(humidityRatio) }),
		toChart: (point) => ({ dryBulb: x.invert(point.x), humidityRatio: y.invert(point.y) })
	};
}
