import { describe, expect, it } from 'vitest';
import { cleanHistory, hasWords } from './history-html.js';

describe('cleanHistory', () => {
  it('keeps headings, lists, tables, paragraphs and emphasis', () => {
    const html =
      '<h2>Course</h2><p>Fever <strong>daily</strong> and <em>sweats</em></p><ul><li><p>rash</p></li></ul>' +
      '<table><tbody><tr><th colspan="2">Day</th></tr><tr><td>1</td><td>38.5</td></tr></tbody></table>';
    expect(cleanHistory(html)).toBe(html);
  });

  it.each([
    ['<script>alert(1)</script><p>a</p>', '<p>a</p>'],
    ['<p onclick="alert(1)" style="x" class="y">a</p>', '<p>a</p>'],
    ['<img src=x onerror=alert(1)><p>a</p>', '<p>a</p>'],
    ['<a href="javascript:alert(1)">a</a>', 'a'],
    ['<a href="https://a.example">a</a>', 'a'],
    ['<svg><script>alert(1)</script></svg><p>a</p>', '<p>a</p>'],
    ['<iframe srcdoc="<p>b</p>">b</iframe><p>a</p>', '<p>a</p>'],
    ['<td colspan="2" onmouseover="x">a</td>', '<td colspan="2">a</td>'],
    ['<td colspan="99999999999">a</td>', '<td>a</td>'],
    ['<p>a<!-- hidden --></p>', '<p>a</p>'],
    ['<math><mi xlink:href="data:x,<script>alert(1)</script>">b</mi></math><p>a</p>', '<p>a</p>'],
    ['<form action="/api/session"><input name="p">a</form>', 'a'],
  ])('makes %j harmless', (html, left) => {
    expect(cleanHistory(html)).toBe(left);
  });

  it('changes nothing when it is run on its own result', () => {
    const once = cleanHistory('<p>a < b & c</p><<b>script>x');
    expect(cleanHistory(once)).toBe(once);
  });

  it('stands a page nested thousands deep', () => {
    const deep = `${'<ul><li>'.repeat(5000)}x`;
    expect(cleanHistory(deep).length).toBeLessThan(2000);
  });
});

describe('hasWords', () => {
  it.each(['', '<p></p>', '<p>&nbsp; </p>', '<ul><li><br></li></ul>', '<p>\u00a0</p>'])(
    'finds none in %j',
    (html) => {
      expect(hasWords(html)).toBe(false);
    },
  );

  it('finds them in a table', () => {
    expect(hasWords('<table><tr><td>1</td></tr></table>')).toBe(true);
  });
});
