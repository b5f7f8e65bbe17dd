/**
 * Who may import whom, as ESLint overrides. Each folder lists what it may take; all else of ours is refused,
 * type imports included. The same table, in words, is in DEVELOPERS.md.
 */
const folders = [
	'units',
	'physics',
	'diagram',
	'scene',
	'chart',
	'strip',
	'sheet',
	'access',
	'forms',
	'contract',
	'editor',
	'ui',
	'client',
	'server'
];

const PURE = ['units', 'physics', 'diagram', 'scene', 'chart', 'strip', 'sheet'];

/**
 * folder → folders it may import
 * @type {Record<string, string[]>}
 */
export const table = {
	units: [],
	physics: ['units'],
	diagram: ['physics', 'units'],
	scene: ['units'],
	chart: ['scene', 'diagram', 'physics', 'units'],
	strip: ['scene', 'diagram', 'physics', 'units'],
	sheet: ['scene', 'chart', 'strip', 'diagram', 'physics', 'units'],
	access: [],
	contract: ['access', 'diagram', 'physics', 'units'],
	forms: ['access', 'contract', 'diagram', 'physics', 'units'],
	client: ['contract', 'access', 'diagram', 'units'],
	editor: [...PURE, 'access', 'contract', 'forms', 'client'],
	ui: [...PURE, 'access', 'contract', 'forms', 'client', 'editor'],
	server: [...PURE, 'access', 'contract', 'forms']
};

/** @param {string} from @param {string[]} allowed */
const deny = (from, allowed) => ({
	group: folders.filter((f) => f !== from && !allowed.includes(f)).map((f) => `$lib/${f}/**`),
	message: `src/lib/${from} may import only: ${[from, ...allowed].join(', ')}. See the import table in DEVELOPERS.md.`
});
const noRelativeEscape = {
	regex: '^(\\.\\./)+(units|physics|diagram|scene|chart|strip|sheet|access|forms|contract|editor|ui|client|server)/',
	message: 'Import another folder of src/lib through $lib.'
};
const noKit = { group: ['$app/*', '$env/*', '@sveltejs/*'], message: 'This folder knows nothing of SvelteKit.' };
/** @param {string[]} allowed */
const noPackages = (allowed) => ({
	regex: `^(?!\\.|\\$lib/${allowed.map((p) => `|${p}$`).join('')})`,
	message: 'This pure folder takes no package but those in the import table.'
});
/**
 * @param {object[]} patterns
 * @returns {import('eslint').Linter.RuleEntry}
 */
const restrict = (patterns) => ['error', { patterns }];
/** @type {Record<string, string[]>} */
const packages = {
	diagram: ['zod'],
	chart: ['d3-scale', 'd3-shape', 'd3-array'],
	sheet: ['d3-scale', 'd3-shape', 'd3-array']
};

/**
 * @param {string} layer @param {string[]} banned
 * @returns {import('eslint').Linter.Config}
 */
const serverLayer = (layer, banned) => ({
	files: [`src/lib/server/${layer}/**/*.ts`],
	rules: {
		'no-restricted-imports': restrict([
			{
				group: banned.map((b) => `$lib/server/${b}/**`),
				message: `server/${layer} may not import ${banned.join(', ')}: layers go db → repo → services.`
			},
			deny('server', table.server ?? []),
			noRelativeEscape
		])
	}
});

/** @type {import('eslint').Linter.Config[]} */
export const importRules = [
	...Object.entries(table).map(([from, allowed]) => ({
		files: [`src/lib/${from}/**/*.ts`, `src/lib/${from}/**/*.svelte`],
		ignores: ['**/*.test.ts'],
		rules: {
			'no-restricted-imports': restrict([
				deny(from, allowed),
				noRelativeEscape,
				...(PURE.includes(from) ? [noPackages(packages[from] ?? [])] : []),
				...(from === 'editor'
					? [
							{
								group: ['$app/navigation', '$app/state', '$app/forms', '$app/paths', '$app/server'],
								message: 'The editor is free of pages; pass such things in.'
							}
						]
					: []),
				...(['access', 'contract', 'forms'].includes(from) ? [noKit] : [])
			])
		}
	})),
	{
		files: PURE.map((f) => `src/lib/${f}/**/*.ts`),
		ignores: ['**/*.test.ts'],
		rules: {
			'no-restricted-globals': [
				'error',
				'window',
				'document',
				'fetch',
				'process',
				'localStorage',
				'performance',
				'crypto'
			],
			'no-restricted-syntax': [
				'error',
				{ selector: "NewExpression[callee.name='Date']", message: 'Pure code has no clock.' },
				{ selector: "MemberExpression[object.name='Date'][property.name='now']", message: 'Pure code has no clock.' },
				{
					selector: "MemberExpression[object.name='Math'][property.name='random']",
					message: 'Pure code has no chance.'
				}
			]
		}
	},
	serverLayer('db', ['repo', 'services']),
	serverLayer('repo', ['services']),
	{
		files: ['src/routes/**/*.ts'],
		ignores: ['src/routes/**/+page.ts', 'src/routes/**/+layout.ts'],
		rules: {
			'no-restricted-imports': restrict([
				{ group: ['$lib/server/db/**', '$lib/server/repo/**'], message: 'A route calls a service.' }
			])
		}
	},
	{
		files: ['src/routes/**/*.svelte', 'src/routes/**/+page.ts', 'src/routes/**/+layout.ts'],
		rules: {
			'no-restricted-imports': restrict([{ group: ['$lib/server/**'], message: 'Server code stays on the server.' }])
		}
	}
];
