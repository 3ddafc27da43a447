/** Where the PDF of a dossier is kept. */
export const dossierKey = (organisationId: string, dossierId: string) => `${organisationId}/dossiers/${dossierId}.pdf`;
