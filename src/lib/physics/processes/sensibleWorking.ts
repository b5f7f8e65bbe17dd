import { formatValue } from '$lib/units/format';
import { unitSymbol } from '$lib/units/convert';
import type { UnitSystem } from '$lib/units/quantities';
import type { WorkingStep } from '../types';
import type { ProcessInput, ProcessSolution } from './types';

const FIRST_LAW = 'First law for steady flow, per kg of dry air';

/**
 * Dry-air, water and energy balance of sensible heating or cooling in display units. The last step is the duty as
 * the screen shows it, signed.
 */
export function sensibleWorking(input: ProcessInput, solution: ProcessSolution, system: UnitSystem): WorkingStep[] {
	const inlet = input.inlets[0];
	if (!inlet) return [];
	const { outlet, duties } = solution;
	const text = (value: number, quantity: Parameters<typeof formatValue>[1]) => formatValue(value, quantity, system);
	const flow = text(inlet.dryAirKgPerS, 'massFlow');
	return [
		{
			symbol: 'ṁ₂',
			equation: 'ṁ₂ = ṁ₁',
			substituted: `ṁ₁ = ${flow}`,
			result: text(outlet.dryAirKgPerS, 'massFlow'),
			unit: unitSymbol('massFlow', system),
			source: 'Balance of dry air'
		},
		{
			symbol: 'W₂',
			equation: 'W₂ = W₁',
			substituted: `W₁ = ${text(inlet.state.humidityRatio, 'humidityRatio')}`,
			result: text(outlet.state.humidityRatio, 'humidityRatio'),
			unit: unitSymbol('humidityRatio', system),
			source: 'Balance of water: none is added or removed'
		},
		{
			symbol: 'Q',
			equation: 'Q = ṁ (h₂ − h₁)',
			substituted: `${flow} × (${text(outlet.state.enthalpy, 'enthalpy')} − ${text(inlet.state.enthalpy, 'enthalpy')})`,
			result: formatValue(duties.total, 'power', system, { signed: true }),
			unit: unitSymbol('power', system),
			source: FIRST_LAW
		}
	];
}
