import { connect, type Db } from '$lib/server/db/client';
import { AppError } from '$lib/server/errors';
import { binDiagram, createDiagram, openDiagram, restoreDiagram, saveDiagram } from '$lib/server/services/diagrams';
import type { Principal } from '$lib/access/principal';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { emptyDiagram, makeFirm } from '../support/firm';

let db: Db;
beforeAll(() => {
	if (!process.env.DATABASE_URL) throw new Error('DATABASE_URL is not set: run these tests by npm run test:db.');
	db = connect(process.env.DATABASE_URL);
});
afterAll(() => db.$client.end());

const withNotes = (notes: string) => ({ ...emptyDiagram, notes });
const codeOf = (promise: Promise<unknown>) =>
	promise.then(
		() => 'done',
		(error: unknown) => (error instanceof AppError ? error.code : Promise.reject(error))
	);

async function firmWithDiagram() {
	const firm = await makeFirm(db);
	const author = await firm.person('designer', 'author');
	const id = await createDiagram(db, author, { projectId: firm.projectId, name: 'Winter', document: emptyDiagram });
	return { firm, author, id };
}

describe('saveDiagram', () => {
	it('keeps what was sent, character for character', async () => {
		const { author, id } = await firmWithDiagram();
		const document = withNotes('Zürich ~ 12 °C ≥ 😀 "quoted" \\ \'');
		await expect(saveDiagram(db, author, id, { revision: 1, document })).resolves.toMatchObject({ revision: 2 });
		await expect(openDiagram(db, author, id)).resolves.toMatchObject({ revision: 2, document });
	});

	it('lets exactly one of many saves at once win, and tells the others who it was', async () => {
		const { author, id } = await firmWithDiagram();
		const codes = await Promise.all(
			Array.from({ length: 8 }, (_, i) =>
				codeOf(saveDiagram(db, author, id, { revision: 1, document: withNotes(`${i}`) }))
			)
		);
		expect(codes.filter((code) => code === 'done')).toHaveLength(1);
		expect(codes.filter((code) => code === 'stale')).toHaveLength(7);
		await expect(saveDiagram(db, author, id, { revision: 1, document: withNotes('late') })).rejects.toMatchObject({
			details: { revision: 2, savedBy: 'designer author' }
		});
	});

	it('takes the same document sent twice for one save', async () => {
		const { author, id } = await firmWithDiagram();
		const request = { revision: 1, document: withNotes('once') };
		const first = await saveDiagram(db, author, id, request);
		await expect(saveDiagram(db, author, id, request)).resolves.toEqual(first);
	});
});

describe('the bin', () => {
	it('hides a diagram until it is restored', async () => {
		const { author, id } = await firmWithDiagram();
		await binDiagram(db, author, id);
		expect(await codeOf(openDiagram(db, author, id))).toBe('notFound');
		expect(await codeOf(saveDiagram(db, author, id, { revision: 1, document: withNotes('x') }))).toBe('notFound');
		await restoreDiagram(db, author, id);
		await expect(openDiagram(db, author, id)).resolves.toMatchObject({ revision: 1 });
	});
});

describe('access to a diagram', () => {
	const uses = (who: Principal, id: string) =>
		Promise.all([
			codeOf(openDiagram(db, who, id)),
			codeOf(saveDiagram(db, who, id, { revision: 99, document: emptyDiagram })),
			codeOf(binDiagram(db, who, id))
		]);

	it('is the same "not found" for another firm’s principal as for a thing that does not exist', async () => {
		const { id } = await firmWithDiagram();
		const stranger = await (await makeFirm(db)).person('principal');
		const nothing = '018f0000-0000-7000-8000-000000000000';
		expect(await uses(stranger, id)).toEqual(['notFound', 'notFound', 'notFound']);
		expect(await uses(stranger, id)).toEqual(await uses(stranger, nothing));
	});

	it.each([
		['designer', null, ['notFound', 'notFound', 'notFound']],
		['trainee', null, ['notFound', 'notFound', 'notFound']],
		['guest', 'viewer', ['done', 'forbidden', 'forbidden']],
		['designer', 'checker', ['done', 'forbidden', 'forbidden']],
		['trainee', 'author', ['done', 'stale', 'done']],
		['principal', null, ['done', 'stale', 'done']]
	] as const)('of a %s who is %s on the project', async (firmRole, projectRole, expected) => {
		const { firm, id } = await firmWithDiagram();
		const who = await firm.person(firmRole, projectRole);
		const [open, save] = [
			await codeOf(openDiagram(db, who, id)),
			await codeOf(saveDiagram(db, who, id, { revision: 99, document: emptyDiagram }))
		];
		expect([open, save, await codeOf(binDiagram(db, who, id))]).toEqual(expected);
	});
});
