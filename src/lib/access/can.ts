import type { FirmRole, ProjectRole } from './principal';

/** What can be asked of the server. A new action is a new row of the table below and of its test. */
export type Action =
	'project.create' | 'project.view' | 'project.edit' | 'diagram.view' | 'diagram.draw' | 'diagram.bin';

const PROJECT: Record<ProjectRole, readonly Action[]> = {
	lead: ['project.view', 'project.edit', 'diagram.view', 'diagram.draw', 'diagram.bin'],
	author: ['project.view', 'diagram.view', 'diagram.draw', 'diagram.bin'],
	checker: ['project.view', 'diagram.view'],
	viewer: ['project.view', 'diagram.view']
};

/** What a role in the firm allows by itself, and the most that a role on a project can give someone of it. */
const FIRM: Record<FirmRole, { readonly everywhere: readonly Action[]; readonly onProjects: readonly Action[] }> = {
	principal: { everywhere: ['project.create', ...PROJECT.lead], onProjects: PROJECT.lead },
	designer: { everywhere: ['project.create'], onProjects: PROJECT.lead },
	trainee: { everywhere: [], onProjects: PROJECT.author },
	guest: { everywhere: [], onProjects: PROJECT.viewer }
};

/**
 * Whether someone may do something. `projectRole` is null off a project and for who has not been added to it. That
 * project and person belong to the same firm is the caller's to make sure of: outside, the answer is "not found".
 */
export function can(action: Action, firmRole: FirmRole, projectRole: ProjectRole | null): boolean {
	const { everywhere, onProjects } = FIRM[firmRole];
	if (everywhere.includes(action)) return true;
	return projectRole !== null && onProjects.includes(action) && PROJECT[projectRole].includes(action);
}
