/**
 * Runs the last of many calls once per animation frame: a pointer may report several times between two frames, and
 * only the last place can be seen.
 */
export interface FrameCall<T> {
	(value: T): void;
	/** Runs a waiting call at once. */
	flush(): void;
	cancel(): void;
}

/** Wraps `call` so that it runs at most once per frame, with the newest value. */
export function onFrame<T>(call: (value: T) => void): FrameCall<T> {
	let waiting: { value: T } | null = null;
	let frame = 0;
	const run = (): void => {
		const next = waiting;
		waiting = null;
		frame = 0;
		if (next) call(next.value);
	};
	const ask = (value: T): void => {
		waiting = { value };
		if (frame === 0) frame = requestAnimationFrame(run);
	};
	const cancel = (): void => {
		cancelAnimationFrame(frame);
		waiting = null;
		frame = 0;
	};
	const flush = (): void => {
		cancelAnimationFrame(frame);
		run();
	};
	return Object.assign(ask, { flush, cancel });
}
