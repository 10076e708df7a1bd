import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { analysisUses } from '../reports/block-usage';
import { movePins } from '../reports/move-pins';
import { recordStudyChange } from '../studies/record-study-change';

/** Removes an analysis that no report shows; its versions and results stay, for the record. */
export async function removeAnalysis(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  analysisId: string,
): Promise<Outcome<undefined>> {
  const { unitOfWork, stores } = dependencies.database;
  return unitOfWork<Outcome<undefined>>(`study:${studyId}`, async (unit) => {
    const analysis = await stores.analyses.find(studyId, analysisId, unit);
    if (analysis === null) return refuse('notFound');
    const uses = (await analysisUses(dependencies, studyId, unit)).get(analysisId) ?? [];
    const reports = uses.map(({ title }) => title);
    if (reports.length > 0) return refuse('analysisInUse', { facts: { reports } });
    const personId = person.id;
    await movePins(dependencies, { studyId, analysisId, resultId: null, personId }, unit);
    await stores.analyses.remove(analysisId, timestamp(dependencies.clock), unit);
    const before = { analysis: analysisId, name: analysis.name };
    const record = { studyId, personId, what: 'analysis.removed', before, after: null };
    await recordStudyChange(dependencies, record, unit);
    return { ok: true, value: undefined };
  });
}
