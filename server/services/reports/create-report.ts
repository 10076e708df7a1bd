import type { NewReportRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuseField, type Outcome } from '../../errors/server-issue';
import type { StoredReport } from '../../models/report/report-store';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';

/** Begins a report without blocks; gives its id. */
export async function createReport(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  { title, houseStyleId }: NewReportRequest,
): Promise<Outcome<string>> {
  const { database, houseStyles } = dependencies;
  if (!houseStyles.some(({ id }) => id === houseStyleId)) {
    return refuseField('houseStyleId', 'There is no such house style.');
  }
  const report = newReport(dependencies, person, studyId, title, houseStyleId);
  await database.unitOfWork(`study:${studyId}`, async (unit) => {
    await database.stores.reports.insert(report, unit);
    const record = { studyId, personId: person.id, what: 'report.created', before: null };
    const after = { report: report.id, title, houseStyle: houseStyleId };
    await recordStudyChange(dependencies, { ...record, after }, unit);
  });
  return { ok: true, value: report.id };
}

function newReport(
  { clock, ids }: Dependencies,
  person: User,
  studyId: string,
  title: string,
  houseStyleId: string,
): StoredReport {
  const now = timestamp(clock);
  return {
    id: ids.next(),
    studyId,
    title,
    seq: 0,
    framing: 'both',
    framingPolicy: null,
    houseStyleId,
    profile: null,
    stage: 'drafting',
    settingsVersion: 1,
    createdAt: now,
    updatedAt: now,
    updatedBy: person.id,
    removedAt: null,
  };
}
