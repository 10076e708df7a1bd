import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';

/** Removes a report from its study; its steps stay, for the record. */
export async function removeReport(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  reportId: string,
): Promise<Outcome<undefined>> {
  const { database, clock } = dependencies;
  return database.unitOfWork<Outcome<undefined>>(`report:${reportId}`, async (unit) => {
    const report = await database.stores.reports.find(studyId, reportId, unit);
    if (report === null) return refuse('notFound');
    await database.stores.reports.remove(reportId, timestamp(clock), unit);
    const record = { studyId, personId: person.id, what: 'report.removed' };
    const before = { report: reportId, title: report.title };
    await recordStudyChange(dependencies, { ...record, before, after: null }, unit);
    return { ok: true, value: undefined };
  });
}
