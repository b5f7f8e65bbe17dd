/** Colour tokens of the design. The screen has them as CSS variables; files and paper take them from `PALETTES`. */
export type Colour = keyof typeof LIGHT;
export type FillName = Colour;
export type Palette = Readonly<Record<Colour, string>>;
export type PaletteName = keyof typeof PALETTES;

const LIGHT = {
	paper: '#efe9dc',
	band: '#f5f0e5',
	plate: '#faf6ee',
	dom: '#fffdf8',
	field: '#ffffff',
	ink1: '#14202e',
	ink2: '#414e5c',
	ink3: '#5c6772',
	edge: '#7e858b',
	rule: '#cfc7b6',
	ruleSoft: '#e2dbcc',
	ember: '#b5380e',
	glacier: '#17589b',
	reed: '#0a6f5b',
	straw: '#87590a',
	emberWash: '#f8e3d8',
	glacierWash: '#dde9f4',
	reedWash: '#d9ede6',
	strawWash: '#f5e8cc',
	marker: '#ffe27a',
	markerEdge: '#8a6a00',
	cRh: '#838d96',
	cWb: '#838d96',
	cVol: '#838d96',
	cMajor: '#d3cfc4',
	cMinor: '#ece7dc',
	cText: '#4f5b67',
	cEdge: '#3b4856'
};

/** White ground; path colours darker than the chart's lines also in grey. */
const PRINT: Record<keyof typeof LIGHT, string> = {
	...LIGHT,
	paper: '#ffffff',
	band: '#ffffff',
	plate: '#ffffff',
	dom: '#ffffff',
	ember: '#9c2d07',
	glacier: '#0f4a86',
	reed: '#075c4b',
	straw: '#6e4700',
	cRh: '#858e96',
	cWb: '#858e96',
	cVol: '#858e96',
	cMajor: '#d9dbdd',
	cMinor: '#eceeef',
	rule: '#b9bec3',
	ruleSoft: '#d9dbdd'
};

const BLACK_AND_WHITE: Record<keyof typeof LIGHT, string> = {
	...PRINT,
	ink1: '#000000',
	ink2: '#333333',
	ink3: '#4d4d4d',
	ember: '#000000',
	glacier: '#000000',
	reed: '#000000',
	straw: '#000000',
	emberWash: '#ffffff',
	glacierWash: '#ffffff',
	reedWash: '#ffffff',
	strawWash: '#ffffff',
	cRh: '#8c8c8c',
	cWb: '#8c8c8c',
	cVol: '#8c8c8c',
	cMajor: '#d9d9d9',
	cMinor: '#ececec',
	cText: '#4d4d4d',
	cEdge: '#333333'
};

export const PALETTES = { light: LIGHT, print: PRINT, blackAndWhite: BLACK_AND_WHITE } as const;

export interface Stroke {
	readonly colour: Colour;
	readonly width: number;
	readonly dash?: readonly number[];
	readonly cap?: 'butt' | 'round';
}

/** Named lines. Families of the chart differ by weight and dash, never by hue. */
export const STROKES = {
	saturation: { colour: 'ink1', width: 1.9 },
	relativeHumidity: { colour: 'cRh', width: 0.85 },
	wetBulb: { colour: 'cWb', width: 0.75, dash: [7, 3] },
	specificVolume: { colour: 'cVol', width: 0.9, dash: [0.1, 3.4], cap: 'round' },
	gridMajor: { colour: 'cMajor', width: 0.8 },
	gridMinor: { colour: 'cMinor', width: 0.6 },
	edgeScale: { colour: 'cEdge', width: 1 },
	edgeTick: { colour: 'cEdge', width: 0.8 },
	casing: { colour: 'dom', width: 3 },
	heat: { colour: 'ember', width: 3.2 },
	cool: { colour: 'glacier', width: 3.2 },
	humidify: { colour: 'reed', width: 3.2, dash: [7, 2.2] },
	dehumidify: { colour: 'straw', width: 3.2, dash: [7, 2.2] },
	neutral: { colour: 'ink1', width: 2.2 },
	construction: { colour: 'ink2', width: 1, dash: [1.5, 3], cap: 'round' },
	locus: { colour: 'marker', width: 12, cap: 'round' },
	marker: { colour: 'marker', width: 20, cap: 'round' },
	markerEdge: { colour: 'markerEdge', width: 21.6, cap: 'round' },
	ring: { colour: 'ink1', width: 2 },
	ringThin: { colour: 'ink1', width: 1 },
	markerRing: { colour: 'markerEdge', width: 1 },
	leader: { colour: 'ink2', width: 0.8 },
	plumb: { colour: 'ink2', width: 0.9, dash: [1.5, 2.5] },
	frame: { colour: 'ink1', width: 1.2 },
	frameHeavy: { colour: 'ink1', width: 1.8 },
	rule: { colour: 'rule', width: 1 },
	ruleSoft: { colour: 'ruleSoft', width: 1 },
	duct: { colour: 'ink1', width: 1.1 },
	equipment: { colour: 'ink1', width: 1.4 }
} as const satisfies Record<string, Stroke>;
export type StrokeName = keyof typeof STROKES;

export interface TextStyle {
	readonly size: number;
	readonly weight: 400 | 500 | 600 | 700;
	readonly colour: Colour;
	readonly tabular?: boolean;
}

/** Named type. Never below 11 on screen but for units and subscripts. */
export const TEXTS = {
	scale: { size: 11, weight: 400, colour: 'cText', tabular: true },
	scaleTitle: { size: 11, weight: 600, colour: 'ink1' },
	scaleUnit: { size: 10, weight: 400, colour: 'ink2' },
	gutter: { size: 11, weight: 400, colour: 'cText' },
	family: { size: 11, weight: 400, colour: 'cText' },
	tagName: { size: 12, weight: 600, colour: 'ink1' },
	tagValue: { size: 11, weight: 400, colour: 'ink2', tabular: true },
	tagUnit: { size: 10, weight: 400, colour: 'ink2' },
	chip: { size: 11, weight: 600, colour: 'plate' },
	processName: { size: 11.5, weight: 600, colour: 'ink1' },
	title: { size: 24, weight: 600, colour: 'ink1' },
	heading: { size: 13, weight: 600, colour: 'ink1' },
	body: { size: 11.5, weight: 400, colour: 'ink1' },
	bodyStrong: { size: 11.5, weight: 600, colour: 'ink1' },
	figure: { size: 11.5, weight: 400, colour: 'ink1', tabular: true },
	figureStrong: { size: 11.5, weight: 600, colour: 'ink1', tabular: true },
	unit: { size: 10, weight: 400, colour: 'ink2' },
	label: { size: 10.5, weight: 400, colour: 'ink2' },
	fieldValue: { size: 13, weight: 600, colour: 'ink1' },
	fieldLarge: { size: 17, weight: 600, colour: 'ink1' }
} as const satisfies Record<string, TextStyle>;
export type TextName = keyof typeof TEXTS;
