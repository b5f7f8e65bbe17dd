import type { FillName, StrokeName, TextName } from './theme';

/**
 * Scene units are CSS pixels, 1/96 inch: a screen draws them as they are, paper at 0.75 pt. One geometry serves
 * the SVG on screen, the SVG file and the PDF; painters only translate.
 */
export interface Point {
	readonly x: number;
	readonly y: number;
}

/**
 * A line or area. `d` has absolute M, L and Z only: pdfkit writes Q as another curve than a browser, so the same
 * process line would bulge less on paper than on screen; curves are polylines fine enough to look round.
 */
export interface PathPrimitive {
	readonly kind: 'path';
	readonly d: string;
	readonly stroke?: StrokeName;
	readonly fill?: FillName;
	/** Multiplies the stroke's width. */
	readonly scale?: number;
	/** Replaces the stroke's width altogether: strands, whose width carries a ratio. */
	readonly width?: number;
	/** Id of the station or process it came from. */
	readonly item?: string;
}

export interface TextRun {
	readonly text: string;
	/** Another style than the primitive's for this run: units, subscripts. */
	readonly style?: TextName;
	/** Shift downwards, in units: subscripts. */
	readonly dy?: number;
}

export interface TextPrimitive {
	readonly kind: 'text';
	readonly x: number;
	/** Baseline. */
	readonly y: number;
	readonly runs: readonly TextRun[];
	readonly style: TextName;
	readonly anchor: 'start' | 'middle' | 'end';
	/** Degrees clockwise about (x, y). */
	readonly rotate?: number;
	readonly scale?: number;
	readonly item?: string;
	/** Underlined, as given values are on paper. */
	readonly underline?: boolean;
	/** Colour other than the style's. */
	readonly fill?: FillName;
	/** A ground of this colour behind the letters, as a halo. */
	readonly halo?: FillName;
}

export interface GroupPrimitive {
	readonly kind: 'group';
	readonly name: string;
	readonly item?: string;
	readonly clip?: { readonly d: string };
	readonly translate?: Point;
	readonly opacity?: number;
	/** Painters with tags or ARIA give the group this alternative text. */
	readonly alt?: string;
	readonly children: readonly Primitive[];
}

export type Primitive = PathPrimitive | TextPrimitive | GroupPrimitive;

export interface Scene {
	readonly width: number;
	readonly height: number;
	readonly children: readonly Primitive[];
}
