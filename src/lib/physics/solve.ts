/**
 * Root of `f` in [a, b] by Brent's method (R. P. Brent, Algorithms for Minimization without Derivatives, 1973, ch. 4).
 * The signs of f(a) and f(b) must differ or one of them be 0; otherwise null. Never throws and always ends: each
 * step at worst halves the bracket.
 */
export function bracketedRoot(f: (x: number) => number, a: number, b: number, tolerance = 1e-13): number | null {
	let [fa, fb] = [f(a), f(b)];
	if (fa === 0) return a;
	if (fb === 0) return b;
	if (!(fa * fb < 0)) return null;
	let c = a;
	let fc = fa;
	let d = b - a;
	let e = d;
	for (let i = 0; i < 200; i++) {
		if (fb * fc > 0) {
			c = a;
			fc = fa;
			d = e = b - a;
		}
		if (Math.abs(fc) < Math.abs(fb)) {
			a = b;
			b = c;
			c = a;
			fa = fb;
			fb = fc;
			fc = fa;
		}
		const limit = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
		const half = (c - b) / 2;
		if (Math.abs(half) <= limit || fb === 0) return b;
		if (Math.abs(e) >= limit && Math.abs(fa) > Math.abs(fb)) {
			const s = fb / fa;
			let p = 2 * half * s;
			let q = 1 - s;
			if (a !== c) {
				const r = fb / fc;
				const u = fa / fc;
				p = s * (2 * half * u * (u - r) - (b - a) * (r - 1));
				q = (u - 1) * (r - 1) * (s - 1);
			}
			if (p > 0) q = -q;
			p = Math.abs(p);
			if (2 * p < Math.min(3 * half * q - Math.abs(limit * q), Math.abs(e * q))) {
				e = d;
				d = p / q;
			} else {
				d = half;
				e = half;
			}
		} else {
			d = half;
			e = half;
		}
		a = b;
		fa = fb;
		b += Math.abs(d) > limit ? d : Math.sign(half) * limit;
		fb = f(b);
	}
	return b;
}
