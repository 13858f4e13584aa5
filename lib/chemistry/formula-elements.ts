import { elementSymbol } from './elements';

/**
 * Elements of a molecular formula, one entry per atom: "C10H8N2", "[Fe(H2O)6]", "CuSO4·5H2O" (a dot
 * or middle dot starts a part with its own leading number). Charges are not part of a formula.
 * @returns element symbols in the order written; null when the text is no formula
 */
export function formulaElements(text: string): string[] | null {
  const parts = text.replace(/\s+/g, '').split(/[·.]/);
  const elements: string[] = [];
  for (const part of parts) {
    const leading = /^(\d*)(.+)$/.exec(part);
    if (!leading) return null;
    const group = parseGroup(leading[2] ?? '');
    if (group === null) return null;
    const times = leading[1] === '' ? 1 : Number(leading[1]);
    if (group.length * times > 100_000) return null;
    for (let n = 0; n < times; n++) elements.push(...group);
  }
  return elements.length > 0 ? elements : null;
}

const closing: Record<string, string> = { '(': ')', '[': ']', '{': '}' };

function parseGroup(text: string): string[] | null {
  const stack: { elements: string[]; close: string }[] = [{ elements: [], close: '' }];
  // "Fe2" → element Fe, count 2; ")6" → closing bracket, count 6; "[" → opening bracket
  const token = /([A-Z][a-z]?)(\d*)|([([{])|([)\]}])(\d*)/y;
  while (token.lastIndex < text.length) {
    const match = token.exec(text);
    const top = stack.at(-1);
    if (!match || !top) return null;
    const [, element, elementCount, open, close, groupCount] = match;
    if (open !== undefined) {
      stack.push({ elements: [], close: closing[open] ?? '' });
      continue;
    }
    const count = Number((element !== undefined ? elementCount : groupCount) || '1');
    let repeated: string[];
    if (element !== undefined) {
      // Only the IUPAC case counts: "CO" is carbon and oxygen, "Co" cobalt.
      if (elementSymbol(element) !== element) return null;
      repeated = [element];
    } else {
      if (stack.length < 2 || close !== top.close) return null;
      repeated = top.elements;
      stack.pop();
    }
    if (repeated.length * count > 100_000) return null;
    const target = stack.at(-1);
    for (let n = 0; n < count; n++) target?.elements.push(...repeated);
  }
  return stack.length === 1 ? (stack[0]?.elements ?? null) : null;
}
