interface Facts {
  readonly standing: string;
}

const words: Readonly<Record<string, string>> = {
  'in-effect': 'in effect',
  'not-yet-in-effect': 'approved, not yet in effect',
  draft: 'draft',
  withdrawn: 'withdrawn',
  expired: 'expired',
};

/** What a revision is worth today. */
export const standingWords = ({ standing }: Facts): string => words[standing] ?? standing;
