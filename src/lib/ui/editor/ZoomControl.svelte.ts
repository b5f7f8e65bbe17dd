import { onFrame } from '$lib/editor/onFrame';
import type { Viewport, ZoomTransform } from '$lib/editor/Viewport.svelte';
import { select, type Selection } from 'd3-selection';
import { untrack } from 'svelte';
import { zoom, zoomIdentity, zoomTransform, type ZoomBehavior } from 'd3-zoom';

/** A tenth of a kelvin is then about 20 px wide: nothing on a chart is read finer. */
const NEAREST = 24;

/** d3-zoom on the plate: wheel, pinch and drag move the viewport; keys and buttons go the same way. */
export class ZoomControl {
	readonly #viewport: Viewport;
	readonly #behavior: ZoomBehavior<SVGSVGElement, unknown>;
	#node: Selection<SVGSVGElement, unknown, null, undefined> | null = null;
	readonly #follow = onFrame((t: ZoomTransform) => {
		this.#viewport.transform = { k: t.k, x: t.x, y: t.y };
	});

	/** `mayPan` says whether a press at an event's place moves the chart rather than something on it. */
	constructor(viewport: Viewport, mayPan: (event: MouseEvent | TouchEvent) => boolean) {
		this.#viewport = viewport;
		this.#behavior = zoom<SVGSVGElement, unknown>()
			.filter((event: MouseEvent | TouchEvent | WheelEvent) => {
				if (event.type === 'wheel') return true;
				if ('button' in event && event.button !== 0) return event.button === 1;
				return mayPan(event);
			})
			.clickDistance(4)
			.on('zoom', (event: { transform: ZoomTransform }) => this.#follow(event.transform));
	}

	/** Attachment for the plate's SVG element. */
	readonly attach = (node: SVGSVGElement): (() => void) => {
		this.#node = select<SVGSVGElement, unknown>(node).call(this.#behavior).on('dblclick.zoom', null);
		$effect(() => {
			void this.#viewport.generation;
			void this.#viewport.extent;
			// Not the transform: a gesture is ahead of it by a frame and would be thrown back.
			untrack(() => this.#bound(node));
		});
		return () => {
			this.#follow.cancel();
			this.#node?.on('.zoom', null);
			this.#node = null;
		};
	};

	by(factor: number): void {
		this.#node?.call(this.#behavior.scaleBy, factor);
		this.#follow.flush();
	}

	/** Moves the chart by a part of its width and height. */
	pan(right: number, down: number): void {
		const { plot } = this.#viewport.homeProjection;
		const { k } = this.#viewport.transform;
		this.#node?.call(this.#behavior.translateBy, (-right * plot.width) / k, (-down * plot.height) / k);
		this.#follow.flush();
	}

	/** Sets how far one can go from the present home range, and takes the viewport's transform as the start. */
	#bound(node: SVGSVGElement): void {
		const { plot } = this.#viewport.homeProjection;
		const [[left, top], [right, bottom]] = this.#viewport.extent;
		const farthest = Math.max(plot.width / (right - left), plot.height / (bottom - top));
		if (!(farthest > 0)) return;
		this.#behavior
			.extent([
				[plot.x, plot.y],
				[plot.x + plot.width, plot.y + plot.height]
			])
			.scaleExtent([farthest, NEAREST])
			.translateExtent([
				[left, top],
				[right, bottom]
			]);
		const { k, x, y } = this.#viewport.transform;
		const kept = zoomTransform(node);
		if (kept.k !== k || kept.x !== x || kept.y !== y)
			this.#node?.property('__zoom', zoomIdentity.translate(x, y).scale(k));
	}
}
