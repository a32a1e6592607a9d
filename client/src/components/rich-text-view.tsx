import { createElement, type ReactNode } from 'react';

/**
 * Elements that may stand in a history. The server keeps no others; this is the second fence, and text is never put
 * into the page as HTML.
 */
const allowed = new Set(
  'h2 h3 h4 p br strong b em i ul ol li blockquote table thead tbody tr th td sub sup'.split(' '),
);

/** Headings begin one below the page's own, whatever they were written as. */
function headingShift(body: HTMLElement): number {
  const levels = Array.from(body.querySelectorAll('h2, h3, h4'), (heading) => Number(heading.tagName[1]));
  return levels.length === 0 ? 0 : Math.min(...levels) - 2;
}

function nodesOf(parent: Node, shift: number): ReactNode[] {
  return Array.from(parent.childNodes, (node, index) => {
    if (node.nodeType === Node.TEXT_NODE) return node.textContent;
    if (!(node instanceof HTMLElement)) return null;
    const name = node.tagName
      .toLowerCase()
      .replace(/^h[234]$/, (heading) => `h${Number(heading[1]) - shift}`);
    if (name === 'script' || name === 'style') return null;
    if (name === 'br') return <br key={index} />;
    const inner = nodesOf(node, shift);
    return allowed.has(name) ? createElement(name, { key: index }, ...inner) : inner;
  });
}

/** Rich text for reading. */
export function RichTextView({ html }: { html: string }) {
  const { body } = new DOMParser().parseFromString(html, 'text/html');
  return <div className="rich-text prose">{nodesOf(body, headingShift(body))}</div>;
}
