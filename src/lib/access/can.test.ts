import { describe, expect, it } from 'vitest';
import { can, type Action } from './can';
import type { FirmRole, ProjectRole } from './principal';

describe('can', () => {
	it.each<[FirmRole, ProjectRole | null, Action[]]>([
		[
			'principal',
			null,
			['project.create', 'project.view', 'project.edit', 'diagram.view', 'diagram.draw', 'diagram.bin']
		],
		['designer', null, ['project.create']],
		[
			'designer',
			'lead',
			['project.create', 'project.view', 'project.edit', 'diagram.view', 'diagram.draw', 'diagram.bin']
		],
		['designer', 'checker', ['project.create', 'project.view', 'diagram.view']],
		['trainee', null, []],
		['trainee', 'lead', ['project.view', 'diagram.view', 'diagram.draw', 'diagram.bin']],
		['trainee', 'author', ['project.view', 'diagram.view', 'diagram.draw', 'diagram.bin']],
		['guest', null, []],
		['guest', 'author', ['project.view', 'diagram.view']]
	])('%s who is %s on the project', (firmRole, projectRole, allowed) => {
		const all: Action[] = [
			'project.create',
			'project.view',
			'project.edit',
			'diagram.view',
			'diagram.draw',
			'diagram.bin'
		];
		expect(all.filter((action) => can(action, firmRole, projectRole))).toEqual(allowed);
	});
});
