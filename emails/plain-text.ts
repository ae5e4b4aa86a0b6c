import type { Block, Fact, MailContent, Practice } from './mail-content'

/** The same message for readers without HTML. */
export function plainText(content: MailContent, practice: Practice): string {
  const foot = `-- \n${content.reason}\n${[practice.name, practice.address].filter(Boolean).join(', ')}`
  return [content.heading, ...content.blocks.map(blockText), foot].join('\n\n') + '\n'
}

function blockText(part: Block): string {
  switch (part.kind) {
    case 'paragraph':
    case 'note':
      return part.text
    case 'link':
      return `${part.label}:\n${part.href}`
    case 'facts':
      return factLines(part.facts)
  }
}

function factLines(facts: readonly Fact[]): string {
  const labelWidth = Math.max(...facts.map(({ label }) => label.length))
  const valueWidth = Math.max(...facts.map(({ value }) => value.length))
  return facts
    .map(({ label, value }) => `${label.padEnd(labelWidth)}  ${value.padStart(valueWidth)}`)
    .join('\n')
}
