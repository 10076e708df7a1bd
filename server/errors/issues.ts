/** What an issue becomes over HTTP. Titles may name facts in braces, as in {seconds}. */
interface IssueAnswer {
  readonly status: number;
  readonly title: string;
  readonly wayOut?: string;
}

/**
 * The one table of everything the API can refuse. The code is the stable id of the problem's
 * `type`; `title` says in plain words what is wrong and `wayOut` what to do. A new refusal is a
 * line here.
 */
export const ISSUES = {
  unreadableRequest: {
    status: 400,
    title: 'The request could not be read.',
    wayOut: 'Send JSON as the description at /api/openapi.json says.',
  },
  invalidRequest: {
    status: 422,
    title: 'Some of what was sent cannot be used.',
    wayOut: 'Correct the fields that are named and send it again.',
  },
  wrongContentType: {
    status: 415,
    title: 'The body has the wrong type: {expected} is needed here.',
  },
  bodyTooLarge: {
    status: 413,
    title: 'The request is larger than {limit} allows.',
    wayOut: 'Send less at a time.',
  },
  fileTooLarge: {
    status: 413,
    title: 'The file is larger than {limit}, the most that can be loaded.',
    wayOut: 'Leave out columns that the analysis does not need, or split the file.',
  },
  fileMissing: {
    status: 422,
    title: 'No file arrived.',
    wayOut: 'Choose a file and send it again.',
  },
  signInNeeded: {
    status: 401,
    title: 'You are not signed in, or your session has ended.',
    wayOut: 'Sign in and try again; what you typed stays in this page.',
  },
  signInFailed: {
    status: 401,
    title: 'The e-mail address and the password do not belong together.',
    wayOut: 'Check both, or ask for a mail to set a new password.',
  },
  signInBlocked: {
    status: 429,
    title: 'Too many failed attempts for this account. Wait {seconds} seconds, then try again.',
    wayOut: 'If you forgot the password, ask for a mail to set a new one.',
  },
  tooManyRequests: {
    status: 429,
    title: 'Too many attempts from this network address. Wait {seconds} seconds, then try again.',
  },
  forgedRequest: {
    status: 403,
    title: 'The request did not come from this application, or its page is out of date.',
    wayOut: 'Reload the page and try again.',
  },
  notAllowed: {
    status: 403,
    title: 'Your role does not allow this.',
    wayOut: 'Ask a lead of the study for a role that does.',
  },
  administratorNeeded: {
    status: 403,
    title: 'Only an administrator may do this.',
    wayOut: 'Ask an administrator.',
  },
  notFound: {
    status: 404,
    title: 'There is nothing here, or it is not yours to see.',
    wayOut: 'Check the address, or ask a lead of the study to add you.',
  },
  wrongCode: {
    status: 403,
    title: 'The code is not the one that the server printed when it started.',
    wayOut: 'Look for the code in the output of the server; a restart prints a new one.',
  },
  firstAdministratorExists: {
    status: 409,
    title: 'An administrator exists already.',
    wayOut: 'Sign in, or ask that administrator for an account.',
  },
  wrongPassword: {
    status: 403,
    title: 'The present password is not right.',
    wayOut: 'Check it, or sign out and ask for a mail to set a new one.',
  },
  linkNotUsable: {
    status: 410,
    title: 'This link has been used already or is too old.',
    wayOut: 'Ask for a new mail from the sign-in page.',
  },
  emailTaken: {
    status: 409,
    title: 'An account with this e-mail address exists already.',
    wayOut: 'Use that account, or give another address.',
  },
  lastAdministrator: {
    status: 409,
    title: 'This is the last administrator who can sign in.',
    wayOut: 'Make somebody else an administrator first.',
  },
  lastLead: {
    status: 409,
    title: 'This is the last lead of the study.',
    wayOut: 'Make somebody else a lead first.',
  },
  memberExists: {
    status: 409,
    title: 'This person is a member of the study already.',
    wayOut: 'Change the role in the list of members.',
  },
  accountDisabled: {
    status: 409,
    title: 'The account of this person is switched off.',
    wayOut: 'Ask an administrator to switch it on first.',
  },
  outcomeInUse: {
    status: 409,
    title: 'An analysis uses this outcome: {analyses}.',
    wayOut: 'Change or remove the analysis first.',
  },
  uploadNotReady: {
    status: 409,
    title: 'The file is not read yet, or it was stored already.',
    wayOut: 'Wait until the file is read, then store it.',
  },
  uploadStored: {
    status: 409,
    title: 'The file was stored as a data cut already.',
    wayOut: 'Load the file again to read it in another way.',
  },
  staleCodeBook: {
    status: 409,
    title: 'Somebody saved version {number} of this code book while you edited.',
    wayOut: 'Look at both versions, then save yours on top of the newer one or give it up.',
  },
  analysisNotComputable: {
    status: 422,
    title: 'The analysis cannot be computed as it stands.',
    wayOut: 'Pick other columns or levels, or correct the code book.',
  },
  countsNotUsable: {
    status: 422,
    title: 'The records cannot be counted as asked.',
    wayOut: 'Pick other columns or levels, or correct the code book.',
  },
  reasonRequired: {
    status: 422,
    title: 'A report shows this analysis: {reports}.',
    wayOut: 'Say why it changes; the reason is kept with the analysis.',
  },
  staleAnalysis: {
    status: 409,
    title: 'Somebody saved version {version} of this analysis while you edited.',
    wayOut: 'Look at the newer version, then save yours on top of it or give it up.',
  },
  staleOutsideEstimate: {
    status: 409,
    title: 'Somebody saved version {version} of this estimate while you edited.',
    wayOut: 'Look at the newer version, then enter yours again or give it up.',
  },
  estimatesNotReadable: {
    status: 422,
    title: 'No estimate was taken over, because the file cannot be used as it is.',
    wayOut: 'Correct what is named and load the file again.',
  },
  estimatesFileTooLarge: {
    status: 413,
    title: 'The file is larger than {limit}, the most that a file of estimates may have.',
    wayOut: 'Check that it is the right file.',
  },
  analysisInUse: {
    status: 409,
    title: 'A report shows this analysis: {reports}.',
    wayOut: 'Take its blocks out of the report first.',
  },
  analysisUnknown: {
    status: 422,
    title: 'The block shows an analysis that is not in this study, or was removed.',
    wayOut: 'Choose another analysis for the block.',
  },
  reportClosed: {
    status: 409,
    title: 'The report is no longer open for changes.',
    wayOut: 'Ask a lead of the study to open it again.',
  },
  stepNotUsable: {
    status: 422,
    title: 'The change cannot be made.',
  },
  blockUnknown: {
    status: 404,
    title: 'This block is not in the report.',
  },
  blockExists: {
    status: 409,
    title: 'A block with this id is in the report already.',
  },
  blockRemoved: {
    status: 409,
    title: 'Somebody removed this block while you edited.',
    wayOut: 'Restore the block to keep your words, or leave it out.',
  },
  staleEdit: {
    status: 409,
    title: 'Somebody changed the same words while you edited.',
    wayOut: 'Look at both versions and choose which one stands.',
  },
  staleMove: {
    status: 409,
    title: 'Somebody moved this block meanwhile.',
    wayOut: 'Look where it stands now, then move it again.',
  },
  pinsMoveThemselves: {
    status: 409,
    title: 'While a report is a draft, its numbers follow the analyses by themselves.',
    wayOut: 'Change the analysis instead.',
  },
  exportFailed: {
    status: 500,
    title: 'The file could not be made; the report itself is as it was.',
    wayOut: 'Try again. If it happens again, tell whoever runs this server.',
  },
  exportTooSlow: {
    status: 503,
    title: 'Making the file took more than {seconds} seconds and was stopped.',
    wayOut: 'Try again when the server is less busy, or split the report.',
  },
  exportsBusy: {
    status: 503,
    title: 'Too many files are being made at the moment.',
    wayOut: 'Try again in a minute.',
  },
  unexpected: {
    status: 500,
    title: 'Something went wrong on the server; it has been written to its log.',
    wayOut: 'Try again. If it happens again, tell whoever runs this server.',
  },
  databaseBusy: {
    status: 503,
    title: 'Another program holds the database; nothing was stored.',
    wayOut: 'Try again in a moment.',
  },
  diskFull: {
    status: 507,
    title: 'The disk of the server is full; nothing was stored.',
    wayOut: 'Tell whoever runs this server, and try again when there is room.',
  },
  diskReadOnly: {
    status: 503,
    title: 'The disk of the server cannot be written; nothing was stored.',
    wayOut: 'Tell whoever runs this server.',
  },
} as const satisfies Record<string, IssueAnswer>;

/** Code of everything the API can refuse. */
export type IssueCode = keyof typeof ISSUES;

/** The answer that belongs to a code. */
export function issueAnswer(code: IssueCode): IssueAnswer {
  return ISSUES[code];
}
