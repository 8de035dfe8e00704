import type { Writer } from '../db/connection';
import { auditLog } from '../db/schema';

/** One line of who did what. */
export interface LogLine {
	firmId: string | null;
	userId: string | null;
	action: string;
	subject: { kind: string; id: string };
	detail?: Record<string, unknown>;
}

/** Writes the line in the same transaction as the deed, so that neither stands without the other. */
export const record = async (writer: Writer, line: LogLine): Promise<void> => {
	await writer.insert(auditLog).values({
		firmId: line.firmId,
		userId: line.userId,
		action: line.action,
		subjectKind: line.subject.kind,
		subjectId: line.subject.id,
		detail: line.detail ?? {}
	});
};
