import type { ColourToken } from '@/tailwind.config';

/** A token as the browser paints it now ("rgb(33, 64, 154)"), for drawings that cannot read CSS variables. */
export function resolveColour(token: ColourToken, within: Element): string {
  const probe = document.createElement('span');
  probe.style.color = `var(--${token})`;
  probe.hidden = true;
  within.append(probe);
  const { color } = getComputedStyle(probe);
  probe.remove();
  return color;
}
