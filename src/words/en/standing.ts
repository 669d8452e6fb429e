/** Why a printed leaf is not one to work from; shown in a frame where every leaf has its digest. */
export const standingWords = {
  noDigest: 'Proof, no digest. Not a sheet to work from.',
  states: {
    'not-approved': 'Proof: not approved. Not to work from.',
    'changed-since-approval': 'Proof: changed since its approval. Not to work from.',
    'review-date-passed':
      'The date of its review has passed. Not to work from until it is reviewed.',
  },
} as const;
