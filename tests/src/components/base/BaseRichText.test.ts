import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import BaseRichText from '../../../../src/components/base/BaseRichText.vue'

const htmlOf = (html: string) => mount(BaseRichText, { props: { html } }).get('.rich').element

describe('BaseRichText', () => {
  it('builds what the server lets through', () => {
    const element = htmlOf(
      '<p><strong>900</strong> and <em>1200</em></p><ol start="3"><li>sand</li></ol>',
    )
    expect(element.querySelector('strong')?.textContent).toBe('900')
    expect(element.querySelector('ol')?.getAttribute('start')).toBe('3')
  })

  it('opens links elsewhere without passing on the page', () => {
    const link = htmlOf('<a href="https://example.org/slump">slump</a>').querySelector('a')
    expect(link?.getAttribute('rel')).toBe('nofollow ugc noopener')
  })

  it.each([
    '<img src=x onerror=alert(1)>',
    '<script>alert(1)</script>',
    '<p onclick="alert(1)" style="position:fixed">text</p>',
    '<a href="javascript:alert(1)">click</a>',
    '<a href="data:text/html,x">click</a>',
    '<svg onload=alert(1)></svg><iframe></iframe>',
  ])('builds nothing that acts from %s', (html) => {
    const element = htmlOf(html)
    expect(element.querySelector('img, script, svg, iframe')).toBeNull()
    const attributes = [...element.querySelectorAll('*')].flatMap((one) => [...one.attributes])
    expect(attributes.map(({ name }) => name).filter((name) => !name.startsWith('data-v'))).toEqual(
      [],
    )
  })
})
