import type { Diagram } from '../schema';
import { MAX_NAME, MAX_NOTES, tooLong } from './renameItem';
import type { CommandResult } from './types';

export function setNotes(diagram: Diagram, { notes }: { readonly notes: string }): CommandResult {
	if (notes.length > MAX_NOTES) return tooLong('The note', notes, MAX_NOTES);
	return { ok: true, diagram: { ...diagram, notes }, label: 'change the notes' };
}

export function setSubtitle(diagram: Diagram, { subtitle }: { readonly subtitle: string }): CommandResult {
	if (subtitle.length > MAX_NAME) return tooLong('The subtitle', subtitle, MAX_NAME);
	return { ok: true, diagram: { ...diagram, subtitle: subtitle.trim() }, label: 'change the subtitle' };
}
