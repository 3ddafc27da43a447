interface For {
  caseId: string;
  checkId: string;
}

/** The address of a sum of the bench that is to answer a check, with what went in when there is something already. */
export const sumHref = (sumId: string, { caseId, checkId }: For, search: Readonly<Record<string, string>> = {}): string =>
  `/bench/${sumId}?${new URLSearchParams({ case: caseId, check: checkId, ...search })}`;
