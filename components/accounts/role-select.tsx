import type { SelectHTMLAttributes } from 'react';

interface RoleSelectProps extends Omit<SelectHTMLAttributes<HTMLSelectElement>, 'className' | 'name'> {
  roles: readonly string[];
}

export function RoleSelect({ roles, ...select }: RoleSelectProps) {
  return (
    <select
      {...select}
      name="role"
      className="min-h-10 w-full rounded border border-rule-strong bg-page px-2 py-1.5 text-ink"
    >
      {roles.map((role) => (
        <option key={role} value={role}>
          {role}
        </option>
      ))}
    </select>
  );
}
