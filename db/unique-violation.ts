/** Whether an error is PostgreSQL's refusal of a second row under this unique constraint (SQLSTATE 23505). */
export function isUniqueViolation(error: unknown, constraint: string): boolean {
  return (
    error instanceof Error &&
    'code' in error &&
    error.code === '23505' &&
    'constraint' in error &&
    error.constraint === constraint
  );
}
