import type { Program } from '../../outputs/record';
import type { PlannedMethod } from '../method';

/** Words that would change the checked part of a deck: atoms, charge, title, task or resources. */
const reserved: Record<Program, RegExp> = {
  // "* xyz 0 1", "%pal nprocs 8 end", "%maxcore 2000", "%coords", "$new_job", "! Opt" (keywords have their own list)
  ORCA: /^\s*(\*|%\s*(pal|maxcore|coords|compound|moinp)\b|\$new_job|!)/i,
  // "--Link1--", "%mem=…"; a route line "#"
  Gaussian: /^\s*(--link1--|%|#)/i,
  NWChem: /^\s*(start|restart|title|charge|geometry|task|memory|echo)\b/i,
  // "molecule {", "optimize('b3lyp')", "memory 2 GB"
  Psi4: /^\s*molecule\b|^\s*memory\b|\b(energy|optimi[sz]e|opt|frequenc(y|ies)|freq|gradient|hessian)\s*\(/i,
};
/** Route keywords that decide task, atoms or charge. */
const reservedKeywords: Record<Program, RegExp> = {
  ORCA: /^(tight|loose|verytight)?opt$|^(an|num)?freq$|^[rua]?(hf|ks)$|^pal\d+$/i,
  Gaussian: /^(opt|freq|stable|geom|guess|nosymm?|scrf)\b/i,
  NWChem: /^(mult|odft|xc|end)\b/i,
  Psi4: /^(reference|basis)\b/i,
};

/** What is wrong with a method's extra lines, or null. Only printable ASCII is let through. */
export function forbiddenExtra(method: PlannedMethod): string | null {
  const { keywords, lines } = method.extra;
  for (const text of [...keywords, ...lines])
    if (!/^[\x20-\x7e]*$/.test(text))
      return `extra line "${text.slice(0, 40)}" has a character outside printable ASCII`;
  for (const keyword of keywords) {
    const clash = keyword.trim() === '' || reservedKeywords[method.program].test(keyword.trim());
    // "#" and "*" would end ORCA's line or start its coordinates; "{" and "}" end Psi4's set block.
    if (clash || /[#*%{}]/.test(keyword))
      return `extra keyword "${keyword}" would change the checked part of the deck`;
  }
  for (const line of lines)
    if (reserved[method.program].test(line))
      return `extra line "${line}" would change the checked part of the deck`;
  return null;
}
