import { describe, expect, it } from 'vitest'
import { renderMarkdown } from '../../../server/fence/markdown'

describe('renderMarkdown', () => {
  it.each([
    ['two lines\nof one paragraph', '<p>two lines<br />\nof one paragraph</p>'],
    ['**900** and *1200*', '<p><strong>900</strong> and <em>1200</em></p>'],
    ['- sand\n- stone', '<ul>\n<li>sand</li>\n<li>stone</li>\n</ul>'],
    ['3. screed', '<ol start="3">\n<li>screed</li>\n</ol>'],
    ['> as you said', '<blockquote>\n<p>as you said</p>\n</blockquote>'],
    ['`3-4-5`', '<p><code>3-4-5</code></p>'],
    ['    a < b', '<pre><code>a &lt; b\n</code></pre>'],
    ['5 < 6 & 7 > 6', '<p>5 &lt; 6 &amp; 7 &gt; 6</p>'],
    ['', ''],
  ])('renders %j', (text, html) => {
    expect(renderMarkdown(text)).toBe(html)
  })

  it.each([
    ['[slump](https://example.org/slump)', 'https://example.org/slump'],
    ['http://example.org', 'http://example.org'],
    ['<mailto:petra@example.org>', 'mailto:petra@example.org'],
  ])('links %j without passing on credit or the opener', (text, href) => {
    expect(renderMarkdown(text)).toContain(`<a href="${href}" rel="nofollow ugc noopener">`)
  })

  it('shows headings, pictures, tables and rules as plain text', () => {
    const html = renderMarkdown(
      '# Big\n\n![crack](https://example.org/a.png)\n\n|a|\n|-|\n|b|\n\n---',
    )
    expect(html).not.toMatch(/<(h1|img|table|hr)/)
    expect(html).toContain('# Big')
  })
})

/** Vectors of the OWASP XSS Filter Evasion Cheat Sheet, by its headings (from memory). */
const owaspVectors: [string, string][] = [
  ['basic XSS test without filter evasion', '<SCRIPT SRC=https://example.org/xss.js></SCRIPT>'],
  [
    'XSS locator (polyglot)',
    `javascript:/*--></title></style></textarea></script></xmp><svg/onload='+/"/+/onmouseover=1/+/[*/[]/+alert(1)//'>`,
  ],
  ['malformed A tags', `\\<a onmouseover="alert(document.cookie)"\\>xxs link\\</a\\>`],
  ['malformed IMG tags', `<IMG """><SCRIPT>alert("XSS")</SCRIPT>"\\>`],
  ['fromCharCode', '<a href="javascript:alert(String.fromCharCode(88,83,83))">Click</a>'],
  ['default SRC tag', `<IMG SRC=# onmouseover="alert('xxs')">`],
  ['on error alert', '<IMG SRC=/ onerror="alert(String.fromCharCode(88,83,83))"></img>'],
  [
    'decimal HTML character references',
    '<a href="&#106;&#97;&#118;&#97;&#115;&#99;&#114;&#105;&#112;&#116;&#58;alert(1)">Click</a>',
  ],
  [
    'hexadecimal HTML character references without trailing semicolons',
    '<a href="&#x6A&#x61&#x76&#x61&#x73&#x63&#x72&#x69&#x70&#x74&#x3A&#x61&#x6C&#x65&#x72&#x74(1)">Click</a>',
  ],
  ['embedded tab', '<a href="jav\tascript:alert(1)">Click</a>'],
  ['embedded encoded newline', '<a href="jav&#x0A;ascript:alert(1)">Click</a>'],
  [
    'spaces and meta chars before the JavaScript',
    '<a href=" &#14;  javascript:alert(1)">Click</a>',
  ],
  ['non-alpha-non-digit', '<SCRIPT/XSS SRC="https://example.org/xss.js"></SCRIPT>'],
  ['extraneous open brackets', '<<SCRIPT>alert("XSS");//\\<</SCRIPT>'],
  ['no closing script tags', '<SCRIPT SRC=https://example.org/xss.js?< B >'],
  ['half open HTML/JavaScript', `<IMG SRC="\`('XSS')"`],
  ['double open angle brackets', '<iframe src=https://example.org/scriptlet.html <'],
  ['end title tag', '</TITLE><SCRIPT>alert("XSS");</SCRIPT>'],
  ['input image', `<INPUT TYPE="IMAGE" SRC="javascript:alert('XSS');">`],
  ['SVG object tag', `<svg/onload=alert('XSS')>`],
  ['body tag', `<BODY ONLOAD=alert('XSS')>`],
  ['link href', `<LINK REL="stylesheet" HREF="javascript:alert('XSS');">`],
  [
    'meta with data URL',
    '<META HTTP-EQUIV="refresh" CONTENT="0;url=data:text/html base64,PHNjcmlwdD4=">',
  ],
  ['style attribute', `<DIV STYLE="background-image: url(javascript:alert('XSS'))">`],
  ['style tag', `<STYLE>li {list-style-image: url("javascript:alert('XSS')");}</STYLE>`],
  ['object tag', '<OBJECT TYPE="text/x-scriptlet" DATA="https://example.org/x.html"></OBJECT>'],
  ['base tag', `<BASE HREF="javascript:alert('XSS');//">`],
  ['Markdown link with javascript:', '[click](javascript:alert(1))'],
  ['Markdown link with entities', '[click](&#106;avascript:alert(1))'],
  ['Markdown link with data:', '[click](data:text/html;base64,PHNjcmlwdD4=)'],
  ['Markdown link with vbscript:', '[click](vbscript:msgbox(1))'],
  ['Markdown link without a scheme', '[click](//example.org)'],
  [
    'Markdown link title breaking out',
    '[click](https://example.org "x\\" onmouseover=\\"alert(1)")',
  ],
  ['Markdown autolink with javascript:', '<javascript:alert(1)>'],
  ['Markdown image with javascript:', '![x](javascript:alert(1))'],
]

describe('OWASP XSS Filter Evasion Cheat Sheet, and its ideas in Markdown (ASVS 1.3.1)', () => {
  const plain = /<(\/?(?:p|br|strong|em|s|ul|ol|li|code|pre|blockquote|a))((?:\s[^<>]*)?)>/g

  it.each(owaspVectors)('%s', (_name, vector) => {
    const html = renderMarkdown(vector)
    const tags = html.match(/<[^>]*>?/g) ?? []
    const known = [...html.matchAll(plain)]
    expect(tags.length).toBe(known.length)
    for (const [, tag, attributes = ''] of known) {
      if (tag === 'a' && attributes) {
        expect(attributes).toMatch(
          /^ href="(https?:\/\/|mailto:)[^"]*" rel="nofollow ugc noopener"$/,
        )
      } else expect(attributes.replace(/^ \/$| start="\d+"/, '')).toBe('')
    }
  })

  it('stays quick with text made to slow a parser', { timeout: 5000 }, () => {
    for (const piece of ['[', '*_', '> ', '`', '<a ', '![](', '- '.repeat(8), '\\']) {
      const startedAt = performance.now()
      renderMarkdown(piece.repeat(10_000 / piece.length))
      expect(performance.now() - startedAt).toBeLessThan(1500)
    }
  })
})
