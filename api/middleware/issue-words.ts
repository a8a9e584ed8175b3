/** What a schema found wrong, in a sentence for people, where the schema has none of its own. */
import type { z } from 'zod';

const KIND_WORDS: Readonly<Record<string, string>> = {
  string: 'a text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  object: 'a group of named fields',
  array: 'a list',
};

function typeWords({ input, expected }: { input?: unknown; expected: string }): string {
  if (input === undefined) return 'This is missing.';
  return `Expected ${KIND_WORDS[expected] ?? 'something else'}.`;
}

function limitWords(issue: z.core.$ZodRawIssue<z.core.$ZodIssueTooBig | z.core.$ZodIssueTooSmall>): string {
  const most = issue.code === 'too_big';
  const limit = String(most ? issue.maximum : issue.minimum);
  if (issue.origin === 'string') return `Use ${limit} characters at ${most ? 'most' : 'least'}.`;
  if (issue.origin === 'array') return `Give ${limit} of them at ${most ? 'most' : 'least'}.`;
  return `This can’t be ${most ? 'above' : 'below'} ${limit}.`;
}

export const issueWords: z.core.$ZodErrorMap = (issue) => {
  switch (issue.code) {
    case 'invalid_type':
      return typeWords(issue);
    case 'too_big':
    case 'too_small':
      return limitWords(issue);
    case 'invalid_value':
      return `Expected ${issue.values.length === 1 ? '' : 'one of: '}${issue.values.map(String).join(', ')}.`;
    default:
      return 'This is not in the form that is wanted here.';
  }
};
