/** What a form sends and nobody types. */
export const Hidden = ({ values }: { values: Readonly<Record<string, string>> }) => Object.entries(values).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} readOnly />);
