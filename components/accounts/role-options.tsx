/** The roles as the options of a select. */
export function RoleOptions({ roles }: { roles: readonly string[] }) {
  return roles.map((role) => (
    <option key={role} value={role}>
      {role}
    </option>
  ));
}
