/** The typed values that a form gets back: all but passwords and React's own fields. */
export function typedValues(form: FormData): Record<string, string> {
  const values: Record<string, string> = {};
  for (const [name, value] of form)
    if (typeof value === 'string' && !name.startsWith('$') && !/password/i.test(name)) values[name] = value;
  return values;
}
