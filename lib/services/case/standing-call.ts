interface Made {
  at: Date;
}

/** A call stands when it is the last and the case was not reopened after it. */
export function standingCall<Call extends Made>(calls: readonly Call[], events: readonly (Made & { kind: string })[]): Call | undefined {
  const last = calls.at(-1);
  const reopenedAt = events.filter(({ kind }) => kind === 'reopened').at(-1)?.at;
  return last && (!reopenedAt || reopenedAt < last.at) ? last : undefined;
}
