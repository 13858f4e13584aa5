/** A mail ready to be handed over, apart from its address. */
export interface MailText {
  subject: string;
  text: string;
  html: string;
}

interface Letter {
  subject: string;
  /** Plain sentences; the link stands between the two parts. */
  before: readonly string[];
  link: { href: string; label: string };
  after: readonly string[];
}

/** One letter in both forms. The HTML is plain on purpose: inline styles, no pictures, nothing fetched. */
export function letter({ subject, before, link, after }: Letter): MailText {
  const text = [...before, link.href, ...after, 'Spinstead'].join('\n\n') + '\n';
  const paragraph = (line: string) => `<p style="margin:0 0 14px">${escapeHtml(line)}</p>`;
  const html = `<!doctype html>
<html lang="en-GB">
<head><meta charset="utf-8"><title>${escapeHtml(subject)}</title></head>
<body style="margin:0;padding:24px;background:#ece6da;color:#211e19;font:16px/1.5 sans-serif">
<div style="max-width:34em;margin:0 auto;padding:24px 28px;background:#faf7f0">
${before.map(paragraph).join('\n')}
<p style="margin:0 0 14px"><a href="${escapeHtml(link.href)}" style="display:inline-block;padding:9px 16px;background:#211e19;color:#faf7f0;text-decoration:none">${escapeHtml(link.label)}</a></p>
${after.map(paragraph).join('\n')}
<p style="margin:0;font-size:13px;color:#6a6356">If the button does nothing, copy this address: ${escapeHtml(link.href)}</p>
</div>
</body>
</html>
`;
  return { subject, text, html };
}

/** Text made safe between tags and inside double quotes. */
export function escapeHtml(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;');
}
