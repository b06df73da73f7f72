const LEFT_OUT = 'script, style, link, meta, base, iframe, object, embed, form, title';

function isSafeAddress(address: string): boolean {
  return /^(https?:|mailto:)/i.test(address.trim());
}

function clean(element: Element): void {
  for (const { name, value } of [...element.attributes]) {
    const isLink = element.tagName === 'A' && name === 'href' && isSafeAddress(value);
    if (!isLink && name !== 'lang' && name !== 'dir') element.removeAttribute(name);
  }
  if (element.tagName === 'A') {
    element.setAttribute('target', '_blank');
    element.setAttribute('rel', 'noopener noreferrer');
  }
}

/** Without styles: the browser reports each that the content security policy refuses, even while parsing. */
function withoutStyles(html: string): string {
  return html
    .replace(/<style\b[\s\S]*?<\/style\s*>/gi, '')
    .replace(/<[a-z][^>]*>/gi, (tag) =>
      tag.replace(/\sstyle\s*=\s*("[^"]*"|'[^']*'|[^\s>]+)/gi, ''),
    );
}

/**
 * A letter's html as a page of its own for a frame without scripts: its words, lists and links, in our
 * letter style. Its own styles are left out, since the content security policy would refuse each.
 */
export function letterDocument(html: string, styleUrl: string): string {
  const letter = new DOMParser().parseFromString(withoutStyles(html), 'text/html');
  for (const element of letter.querySelectorAll(LEFT_OUT)) element.remove();
  for (const element of letter.querySelectorAll('*')) clean(element);
  const lang = letter.documentElement.getAttribute('lang') ?? 'en';
  const page = document.implementation.createHTMLDocument('Letter');
  page.documentElement.lang = lang;
  const style = page.createElement('link');
  style.rel = 'stylesheet';
  style.href = new URL(styleUrl, window.location.href).href;
  page.head.append(style);
  page.body.append(...letter.body.childNodes);
  return `<!doctype html>${page.documentElement.outerHTML}`;
}
