import type { YAMLError } from 'yaml'

/** A mistake of YAML itself in plain words. */
export interface YamlFinding {
  readonly code: string
  readonly message: string
  readonly hint: string
}

const finding = (code: string, message: string, hint: string): YamlFinding => ({ code, message, hint })

export const tabFinding = finding('yaml-tab', 'A line is indented with a tab.', 'Indent with spaces, two a level.')

const quoteIt = 'Put the whole value in quotes.'

const spaceAfterColon = 'Write a space between the colon and the value.'

function missingCharacter(message: string, excerpt: string): YamlFinding {
  if (message.includes('quote')) {
    return finding('yaml-quote', 'The quotation mark opened here is never closed.', 'Close it at the end of the text.')
  }
  if (message.includes('end with')) {
    return finding(
      'yaml-bracket',
      'The bracket opened here is not closed where its lines end.',
      `Close it with “${message.endsWith(']') ? ']' : '}'}”, and indent the lines between the brackets.`,
    )
  }
  if (message.includes('space after :'))
    return finding('yaml-colon', 'There is no space after the colon.', spaceAfterColon)
  if (message.startsWith('Missing ,'))
    return finding('yaml-comma', 'Two entries stand side by side.', 'Write a comma between them.')
  if (message.startsWith('Implicit')) {
    if (excerpt.startsWith('-')) {
      return finding(
        'yaml-list',
        'A list entry stands among keys.',
        'Indent it below the key it belongs to, or write a key, a colon and a space.',
      )
    }
    return /^[^\s:]+:\S/.test(excerpt)
      ? finding('yaml-colon', `There is no space after the colon of “${excerpt}”.`, spaceAfterColon)
      : finding(
          'yaml-colon',
          `“${excerpt}” stands alone, without a colon.`,
          'Write a colon and a space after a key, then its value.',
        )
  }
  if (message.startsWith('Comments')) {
    return finding('yaml-comment', 'A comment begins right after a value.', 'Write a space before the “#”.')
  }
  if (message.startsWith('Sequence item')) {
    return finding('yaml-list', 'A list entry without a dash.', 'Begin every entry of the list with “- ”.')
  }
  if (message.includes('directives-end')) {
    return finding('yaml-directive', 'A directive is not followed by “---”.', 'Take out the line that begins with “%”.')
  }
  if (message.startsWith('Tags and anchors')) {
    return finding('yaml-anchor', 'An anchor or tag runs into what follows it.', 'Write a space after it.')
  }
  return finding('yaml-syntax', 'Something is missing here.', 'Compare with the lines beside it.')
}

function unexpected(message: string, excerpt: string): YamlFinding {
  if (message.startsWith('Unexpected ,') || message.includes('empty item')) {
    return finding(
      'yaml-comma',
      'A comma with nothing before it.',
      'Take one comma out, or write the entry that is missing.',
    )
  }
  if (/flow-(map|seq)-end/.test(message)) {
    return finding(
      'yaml-bracket',
      'A closing bracket that was never opened.',
      'Take it out, or write the opening bracket.',
    )
  }
  if (message.includes('block-seq-ind')) {
    return finding(
      'yaml-list',
      'A list begins on the line of its key.',
      'Start each entry on a line of its own, or write the list in brackets: “[a, b]”.',
    )
  }
  if (message.startsWith('Block scalar header')) {
    return finding(
      'yaml-text-block',
      'Text stands right after the “|” or “>” of a text block.',
      'Start the text on the next line.',
    )
  }
  return finding(
    'yaml-syntax',
    excerpt === '' ? 'Something cannot stand here.' : `“${excerpt}” cannot stand here.`,
    'Compare with the lines beside it, or put the whole value in quotes.',
  )
}

/**
 * What a mistake found by the YAML parser means to someone who writes templates.
 * @param text the file's text from where the mistake begins
 * @param length how much of it is mistaken
 */
export function explainYamlError(error: YAMLError, text: string, length: number): YamlFinding {
  const excerpt = (text.slice(0, length).split('\n', 1)[0] ?? '').trim().slice(0, 30)
  switch (error.code) {
    case 'TAB_AS_INDENT':
      return tabFinding
    case 'BAD_INDENT':
      return error.message.includes('end with')
        ? missingCharacter(error.message, excerpt)
        : finding(
            'yaml-indent',
            'This line is not indented like those beside it.',
            'Line it up with the entries it belongs to.',
          )
    case 'MISSING_CHAR':
      return missingCharacter(error.message, excerpt)
    case 'MULTILINE_IMPLICIT_KEY':
      return missingCharacter('Implicit', excerpt)
    case 'UNEXPECTED_TOKEN':
      return unexpected(error.message, excerpt)
    case 'BAD_DQ_ESCAPE':
      return finding(
        'yaml-escape',
        `“${text.slice(0, 2)}” is no escape sequence.`,
        'Write the text in single quotes, or double the backslash.',
      )
    case 'BAD_SCALAR_START':
      return finding(
        'yaml-character',
        `A value cannot begin with ${text.startsWith('`') ? 'a backtick' : `“${text.slice(0, 1)}”`}.`,
        quoteIt,
      )
    case 'BLOCK_AS_IMPLICIT_KEY':
      return error.message.includes('sequence')
        ? finding(
            'yaml-list',
            'A list entry is not lined up with those before it.',
            'Indent the dashes of a list alike.',
          )
        : finding(
            'yaml-nesting',
            'A second key stands where a value was begun.',
            'Start a new line for it, write the map in braces, or put a text that holds a colon in quotes.',
          )
    case 'BLOCK_IN_FLOW':
      return text.slice(0, length).includes('\n')
        ? finding(
            'yaml-nesting',
            'Indented lines stand inside brackets.',
            'Write everything between the brackets with commas.',
          )
        : finding(
            'yaml-comma',
            `A comma is missing in “${excerpt}”.`,
            'Write a comma between two entries, or put a text that holds a colon in quotes.',
          )
    case 'KEY_OVER_1024_CHARS':
      return finding('yaml-colon', 'A key is more than 1024 characters long.', 'Names have at most 60 characters.')
    case 'MULTIPLE_DOCS':
      return finding(
        'yaml-documents',
        'A second document begins here.',
        'Write one set a file: take out the “---” or “...” between them.',
      )
    case 'BAD_DIRECTIVE':
      return finding('yaml-directive', 'A directive that cannot be read.', 'Take out the line that begins with “%”.')
    case 'ALIAS_PROPS':
    case 'BAD_ALIAS':
    case 'BAD_PROP_ORDER':
    case 'MULTIPLE_ANCHORS':
      return finding(
        'yaml-anchor',
        'An anchor or alias that cannot be read.',
        'Write one anchor, such as “&wall”, before a value, and elsewhere its alias, “*wall”, alone.',
      )
    case 'TAG_RESOLVE_FAILED':
    case 'MULTIPLE_TAGS':
    case 'BAD_COLLECTION_TYPE':
      return finding(
        'yaml-tag',
        `“${excerpt}” is a tag, which a template has no use for.`,
        'Take the tag out, or put the value in quotes.',
      )
    case 'RESOURCE_EXHAUSTION':
      return finding('too-deep', 'Maps and lists are nested too deep.', 'A template never needs more than ten levels.')
    default:
      return finding(
        'yaml-syntax',
        'This cannot be read as YAML.',
        'Compare with the lines beside it, or put the value in quotes.',
      )
  }
}
