/** Keys of everything that the browser keeps, in one place, so that what is written can say what it makes stale. */
export const queryKeys = {
  caseState: (caseId: string) => ['case', caseId, 'state'] as const,
  caseReasons: (caseId: string, version: number) => ['case', caseId, 'reasons', version] as const,
  caseWaiting: (caseId: string) => ['case', caseId, 'waiting'] as const,
  caseProvisional: (caseId: string) => ['case', caseId, 'provisional'] as const,
  casePhotos: (caseId: string) => ['case', caseId, 'photos'] as const,
  casePhotosHere: (caseId: string) => ['case', caseId, 'photos-here'] as const,
  search: (text: string) => ['search', text] as const,
  unitSearch: (text: string) => ['units', 'search', text] as const,
};
