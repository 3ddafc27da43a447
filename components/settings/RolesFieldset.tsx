import { CheckboxField } from '@/components/ui/CheckboxField';
import { FieldError } from '@/components/ui/FieldError';

/** Several allowed, so that boxes and not a list stand here. The first box has the field's name as its id, for the error summary. */
export function RolesFieldset({ roles, isTicked, error }: { roles: readonly RoleChoice[]; isTicked: (role: string) => boolean; error?: string }) {
  return (
    <fieldset className="grid gap-1" aria-describedby={error ? 'roles-error' : undefined}>
      <legend className="label mb-1">Roles</legend>
      {roles.map(({ role, label, means }, index) => (
        <CheckboxField key={role} name="roles" id={index === 0 ? 'roles' : `roles-${role}`} value={role} defaultChecked={isTicked(role)} label={label} hint={means} />
      ))}
      <FieldError id="roles-error" error={error} />
    </fieldset>
  );
}

export interface RoleChoice {
  role: string;
  label: string;
  means: string;
}

/** What each role is for, in the words of whoever hands them out. */
export const ROLE_CHOICES: readonly RoleChoice[] = [
  { role: 'technician', label: 'Technician', means: 'Works on cases, keeps units and fits.' },
  { role: 'engineer', label: 'Engineer', means: 'The same, and keeps compressor models and the rulebook right.' },
  { role: 'manager', label: 'Manager', means: 'Sees cases through, keeps units, fits and compressor models.' },
  { role: 'trainer', label: 'Trainer', means: 'Reads units and compressor models.' },
  { role: 'administrator', label: 'Administrator', means: 'Looks after people, sites, the organisation and the audit.' },
];
