import type { Migration } from './types';

/** The first version: nothing was kept before it, so nothing can arrive here. */
export const initial: Migration = {
	to: 1,
	what: 'Paths, stations given by two properties or produced, processes with given settings.',
	migrate: () => {
		throw new Error('There is no version before 1.');
	}
};
