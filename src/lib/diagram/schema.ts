import { UNITS, type UnitId } from '$lib/units/quantities';
import { z } from 'zod';
import { brokenReferences } from './references';

const id = z.string().regex(/^[0-9a-z-]{1,40}$/i, 'An id has letters, digits and hyphens.');
const name = z.string().max(80, 'A name has at most 80 characters.');
const unit = z.enum(Object.keys(UNITS) as [UnitId, ...UnitId[]]);

/** A number with the unit it was typed in. */
export const givenSchema = z.object({ value: z.number(), unit });

export const propertyNames = [
	'dryBulb',
	'wetBulb',
	'dewPoint',
	'relativeHumidity',
	'humidityRatio',
	'enthalpy',
	'specificVolume',
	'degreeOfSaturation'
] as const;

/** Two properties as typed. That they differ is checked here; that they fix a state is the engine's to say. */
export const pairSchema = z
	.array(z.object({ property: z.enum(propertyNames), given: givenSchema }))
	.length(2, 'Two values fix a state.')
	.refine((p) => p[0]?.property !== p[1]?.property, 'The two values are the same property.');

export const processKinds = [
	'sensibleHeating',
	'sensibleCooling',
	'coolingCoil',
	'steamHumidification',
	'adiabaticHumidification',
	'waterSpray',
	'mixing',
	'sensibleRecovery',
	'enthalpyRecovery',
	'sorptionDehumidification',
	'indirectEvaporativeCooling',
	'fan',
	'duct',
	'room',
	'freeLine'
] as const;

const stationSchema = z.object({
	id,
	pathId: id,
	name,
	/** Given by two properties, or produced by the process that has it as its outlet. */
	source: z.discriminatedUnion('kind', [
		z.object({ kind: z.literal('given'), pair: pairSchema, conditionId: id.optional() }),
		z.object({ kind: z.literal('process') })
	]),
	/** Place of the tag moved by hand, in chart units from the station. */
	tag: z.object({ dx: z.number(), dy: z.number() }).optional()
});

const processSchema = z.object({
	id,
	pathId: id,
	kind: z.enum(processKinds),
	name: name.optional(),
	inletIds: z.array(id).min(1).max(2),
	outletId: id,
	given: z.record(z.string().max(40), givenSchema)
});

const airflowSchema = z.discriminatedUnion('kind', [
	z.object({ kind: z.literal('mass'), given: givenSchema }),
	/** Volume flow at the state of a station of the path. */
	z.object({ kind: z.literal('volume'), given: givenSchema, stationId: id.nullable() }),
	/** Volume flow of standard air, 1.2 kg of dry air per m³. */
	z.object({ kind: z.literal('standard'), given: givenSchema })
]);

const pathSchema = z.object({ id, name, airflow: airflowSchema });

export const DIAGRAM_FORMAT = 'isohume.diagram';
export const DIAGRAM_VERSION = 1;
/** Most paths, stations and processes of a diagram. */
export const MAX_PATHS = 12;
export const MAX_ITEMS = 200;

const documentSchema = z.object({
	format: z.literal(DIAGRAM_FORMAT),
	version: z.literal(DIAGRAM_VERSION),
	/** Second line of the title: the part of the plant. */
	subtitle: name,
	notes: z.string().max(4000),
	/** Departures from the project's site; said in red on the sheet. */
	override: z.object({ pressure: givenSchema.optional(), relations: z.enum(['ideal', 'real']).optional() }),
	paths: z.array(pathSchema).min(1).max(MAX_PATHS),
	stations: z.array(stationSchema).max(MAX_ITEMS),
	processes: z.array(processSchema).max(MAX_ITEMS)
});

/** The document of a diagram, current version: what the user entered, never what follows from it. */
export const diagramSchema = documentSchema.superRefine((document, context) => {
	for (const { path, message } of brokenReferences(document)) context.addIssue({ code: 'custom', path, message });
});

export type Diagram = z.infer<typeof documentSchema>;
export type DiagramStation = Diagram['stations'][number];
export type DiagramProcess = Diagram['processes'][number];
export type DiagramPath = Diagram['paths'][number];
export type Pair = z.infer<typeof pairSchema>;
export type Airflow = z.infer<typeof airflowSchema>;
