import { ProblemError } from '#server/http/errors'

/**
 * What was prepared ahead of the transaction does not fit what the transaction found: somebody
 * changed it in between. The request is prepared and run anew; after some tries it is refused.
 */
export class AheadOutdated extends ProblemError {
  constructor() {
    super(
      'changed-meanwhile',
      'Somebody else is changing this right now. Look at the new version and try again.',
    )
  }
}
