import sanitizeHtml from 'sanitize-html';

const digits = /^\d{1,3}$/;
const cell = (tagName: string, attributes: Record<string, string>): sanitizeHtml.Tag => ({
  tagName,
  attribs: Object.fromEntries(
    Object.entries(attributes).filter(([name, value]) => /^(col|row)span$/.test(name) && digits.test(value)),
  ),
});

const kept: sanitizeHtml.IOptions = {
  allowedTags: [
    ...['p', 'br', 'hr', 'h1', 'h2', 'h3', 'h4', 'blockquote', 'ul', 'ol', 'li'],
    ...['strong', 'b', 'em', 'i', 'u', 's', 'sub', 'sup'],
    ...['table', 'caption', 'thead', 'tbody', 'tfoot', 'tr', 'th', 'td'],
  ],
  allowedAttributes: { th: ['colspan', 'rowspan'], td: ['colspan', 'rowspan'] },
  allowedSchemes: [],
  disallowedTagsMode: 'discard',
  nonTextTags: ['script', 'style', 'textarea', 'option', 'noscript', 'iframe', 'svg', 'math', 'template'],
  nestingLimit: 40,
  transformTags: { th: cell, td: cell },
};

/**
 * What is kept of a written history: headings, paragraphs, lists, tables and emphasis. Images, links, styles,
 * scripts and every attribute but a cell's span are taken out; the words in between stay.
 */
export function cleanHistory(html: string): string {
  return sanitizeHtml(html, kept).trim();
}

/** Whether a written history says anything at all. */
export function hasWords(html: string): boolean {
  return sanitizeHtml(html, { allowedTags: [], allowedAttributes: {} }).replace(/&nbsp;|\s/g, '') !== '';
}
