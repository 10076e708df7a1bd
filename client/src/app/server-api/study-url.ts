/** Address of something within a study; every part is escaped. */
export function studyUrl(studyId: string, ...parts: readonly string[]): string {
  return ['/api/studies', ...[studyId, ...parts].map(encodeURIComponent)].join('/');
}
