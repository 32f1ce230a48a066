import MarkdownIt from 'markdown-it'
import sanitizeHtml from 'sanitize-html'

const markdown = new MarkdownIt('default', { html: false, linkify: true, breaks: true }).disable([
  'image',
  'heading',
  'lheading',
  'table',
  'hr',
])

const linkable = /^(?:https?:\/\/|mailto:)/i

const attributesFor = (href: string): sanitizeHtml.Attributes =>
  linkable.test(href) ? { href, rel: 'nofollow ugc noopener' } : {}

const allowed: sanitizeHtml.IOptions = {
  allowedTags: [
    ...['p', 'br', 'strong', 'em', 's', 'ul', 'ol', 'li'],
    ...['code', 'pre', 'blockquote', 'a'],
  ],
  allowedAttributes: { a: ['href', 'rel'], ol: ['start'] },
  allowedSchemes: ['http', 'https', 'mailto'],
  allowProtocolRelative: false,
  disallowedTagsMode: 'discard',
  transformTags: {
    a: (tagName, { href = '' }) => ({ tagName, attribs: attributesFor(href) }),
  },
}

/**
 * The HTML of what a person wrote in Markdown: paragraphs, emphasis, lists, quotes, code and links
 * to http, https and mailto; nothing else comes through.
 */
export function renderMarkdown(text: string): string {
  return sanitizeHtml(markdown.render(text), allowed).trim()
}
