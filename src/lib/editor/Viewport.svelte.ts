import { projectionOf } from '$lib/chart/projection';
import type { ChartRange, Projection } from '$lib/chart/types';

/** Scale and shift of d3-zoom, without its methods. */
export interface ZoomTransform {
	readonly k: number;
	readonly x: number;
	readonly y: number;
}

const IDENTITY: ZoomTransform = { k: 1, x: 0, y: 0 };

/** How far the chart can be moved to: −60 °C to 120 °C, dry air to 150 g/kg. */
const LIMITS: ChartRange = { dryBulbMin: -60, dryBulbMax: 120, humidityRatioMin: 0, humidityRatioMax: 0.15 };

/**
 * Which part of the chart is in sight. `home` is the range shown at rest; the zoom departs from it. Not undoable and
 * not kept: a view of the drawing is no part of it.
 */
export class Viewport {
	width = $state(0);
	height = $state(0);
	detail: 'full' | 'reduced' = $state('full');
	#home: ChartRange = $state.raw(LIMITS);
	#transform: ZoomTransform = $state.raw(IDENTITY);
	/** Rises with each change of the home range, so that the zoom behaviour can start again from it. */
	generation = $state(0);

	readonly frame = $derived({ width: this.width, height: this.height, textScale: 1, detail: this.detail });
	readonly homeProjection: Projection = $derived(projectionOf(this.frame, this.#home));
	readonly projection: Projection = $derived.by(() => {
		const t = this.#transform;
		if (t.k === 1 && t.x === 0 && t.y === 0) return this.homeProjection;
		const { plot } = this.homeProjection;
		const back = (x: number, y: number) => this.homeProjection.toChart({ x: (x - t.x) / t.k, y: (y - t.y) / t.k });
		const topLeft = back(plot.x, plot.y);
		const bottomRight = back(plot.x + plot.width, plot.y + plot.height);
		return projectionOf(this.frame, {
			dryBulbMin: topLeft.dryBulb,
			dryBulbMax: bottomRight.dryBulb,
			humidityRatioMin: Math.max(0, bottomRight.humidityRatio),
			humidityRatioMax: topLeft.humidityRatio
		});
	});

	/** Corners of the farthest reach in scene units of the home projection, for d3-zoom's translateExtent. */
	readonly extent: [[number, number], [number, number]] = $derived.by(() => {
		const a = this.homeProjection.toScene({ dryBulb: LIMITS.dryBulbMin, humidityRatio: LIMITS.humidityRatioMax });
		const b = this.homeProjection.toScene({ dryBulb: LIMITS.dryBulbMax, humidityRatio: LIMITS.humidityRatioMin });
		return [
			[a.x, a.y],
			[b.x, b.y]
		];
	});

	get isZoomed(): boolean {
		return this.#transform !== IDENTITY;
	}

	get transform(): ZoomTransform {
		return this.#transform;
	}

	set transform(next: ZoomTransform) {
		this.#transform = next.k === 1 && next.x === 0 && next.y === 0 ? IDENTITY : next;
	}

	/** Shows a range from now on. */
	show(range: ChartRange): void {
		this.#home = range;
		this.#transform = IDENTITY;
		this.generation += 1;
	}
}
