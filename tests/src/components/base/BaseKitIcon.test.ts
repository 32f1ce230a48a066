import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import BaseKitIcon from '../../../../src/components/base/BaseKitIcon.vue'
import { KIT_ICON_NAMES } from '../../../../src/components/base/kitIcons'

describe('BaseKitIcon', () => {
  it('draws every thing that it names differently', () => {
    const drawn = KIT_ICON_NAMES.map((name) => mount(BaseKitIcon, { props: { name } }).html())
    expect(new Set(drawn).size).toBe(KIT_ICON_NAMES.length)
  })

  it('draws a toolbox for what it does not know', () => {
    const toolbox = mount(BaseKitIcon, { props: { name: 'generic' } }).html()
    expect(mount(BaseKitIcon, { props: { name: 'constructor' } }).html()).toBe(toolbox)
  })
})
