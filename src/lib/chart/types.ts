import type { EvaluatedDiagram, Site } from '$lib/diagram/evaluated';
import type { ChartPoint } from '$lib/physics/types';
import type { GroupPrimitive, Point } from '$lib/scene/types';
import type { UnitSystem } from '$lib/units/quantities';

/** The part of the chart that is shown, SI. */
export interface ChartRange {
	readonly dryBulbMin: number;
	readonly dryBulbMax: number;
	readonly humidityRatioMin: number;
	readonly humidityRatioMax: number;
}

export interface ChartFrame {
	readonly width: number;
	readonly height: number;
	/** Multiplies weights and type: 1 on screen and at A3, 1.3 on a projector. */
	readonly textScale: number;
	/** Full with all families; reduced for a phone; thumbnail for cards. */
	readonly detail: 'full' | 'reduced' | 'thumbnail';
}

/** The only thing that knows the axes: state ↔ scene units. */
export interface Projection {
	readonly range: ChartRange;
	readonly frame: ChartFrame;
	readonly plot: { readonly x: number; readonly y: number; readonly width: number; readonly height: number };
	toScene(point: ChartPoint): Point;
	toChart(point: Point): ChartPoint;
}

export interface BaseInput {
	readonly projection: Projection;
	readonly site: Site;
	readonly system: UnitSystem;
}

/** Remembered places of tags, so that they do not jump while a station is dragged: offset from the station. */
export type TagPlaces = ReadonlyMap<string, Point>;

export interface PathLayerInput extends BaseInput {
	readonly evaluated: EvaluatedDiagram;
	readonly selectedId: string | null;
	readonly hoveredId: string | null;
	/** Places the tags had before. */
	readonly tagPlaces: TagPlaces;
	/** Places set by hand. */
	readonly fixedTags: TagPlaces;
	/** Curve a station is being dragged along, and where it was. */
	readonly locus?: { readonly line: readonly ChartPoint[]; readonly from: ChartPoint };
}

export interface PathLayer {
	readonly group: GroupPrimitive;
	readonly tagPlaces: TagPlaces;
}
