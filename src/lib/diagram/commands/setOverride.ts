import { airState } from '$lib/physics/air/airState';
import { toSI } from '$lib/units/convert';
import type { Diagram } from '../schema';
import { refuseAs, type CommandResult, type Situation } from './types';

/** Departs from the project's pressure or air relations in this diagram; an empty override follows the project again. */
export function setOverride(
	diagram: Diagram,
	{ override }: { readonly override: Diagram['override'] },
	{ evaluated, system }: Situation
): CommandResult {
	// Any state will do: what is asked is whether the engine takes the pressure and the relations.
	const pressureKPa = override.pressure ? toSI(override.pressure) : evaluated.site.pressureKPa;
	const probe = airState({ dryBulb: 20, relativeHumidity: 0.5 }, pressureKPa, override.relations ?? 'ideal');
	if (!probe.ok) return refuseAs(probe.refusal, system);
	return { ok: true, diagram: { ...diagram, override }, label: 'change the pressure of the diagram' };
}
