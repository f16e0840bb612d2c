/** Address of a section of a survey. */
export function surveyPath(id: string, sectionPath = ''): string {
  return `/survey/${encodeURIComponent(id)}${sectionPath && `/${sectionPath}`}`;
}
