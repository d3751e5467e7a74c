import { describe, expect, it } from 'vitest';
import { markup } from '../../../src/contract/proof/markup.ts';

describe('markup', () => {
  it('escapes every text that is put into it, and takes markup as it is', () => {
    const hostile = `<script>"&'</script>`;
    const inner = markup`<b title="${hostile}">${7}</b>`;
    const { markup: text } = markup`<p>${[inner, hostile]}</p>`;
    expect(text).toBe(
      '<p><b title="&#60;script&#62;&#34;&#38;&#39;&#60;/script&#62;">7</b>&#60;script&#62;&#34;&#38;&#39;&#60;/script&#62;</p>',
    );
  });
});
