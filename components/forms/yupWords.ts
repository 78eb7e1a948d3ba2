import { setLocale } from 'yup';

/** Words for what the schemas leave unsaid; set before the first form is checked. */
setLocale({
  mixed: {
    required: 'Fill this in.',
    notType: ({ type }: { type: string }) =>
      type === 'number' ? 'Write a number.' : 'This cannot be read.',
    oneOf: 'Choose one of the list.',
    notNull: 'Fill this in.',
  },
  string: {
    max: ({ max }: { max: number }) => `At most ${max} characters.`,
    min: ({ min }: { min: number }) => `At least ${min} characters.`,
    email: 'Write an e-mail address, like name@firm.example.',
  },
  number: {
    min: ({ min }: { min: number }) => `At least ${min}.`,
    max: ({ max }: { max: number }) => `At most ${max}.`,
    moreThan: ({ more }: { more: number }) => `More than ${more}.`,
    lessThan: ({ less }: { less: number }) => `Less than ${less}.`,
    positive: 'More than 0.',
    integer: 'A whole number.',
  },
});
