import type { ProcessSolution } from '$lib/physics/processes/types';
import { formatNumber } from '$lib/units/format';

/** Largest residual of the three balances as the screen says it: "closes to 0.0 %". */
export function closureText(balances: ProcessSolution['balances']): string {
	const worst = Math.max(...Object.values(balances).map((b) => Math.abs(b.residual)));
	return `closes to ${formatNumber(worst * 100, 1)} %`;
}
