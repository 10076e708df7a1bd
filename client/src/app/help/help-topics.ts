import analyses from './topics/analyses.md' with { loader: 'text' };
import begin from './topics/begin.md' with { loader: 'text' };
import cautions from './topics/cautions.md' with { loader: 'text' };
import codeBook from './topics/code-book.md' with { loader: 'text' };
import coverage from './topics/coverage.md' with { loader: 'text' };
import data from './topics/data.md' with { loader: 'text' };
import framing from './topics/framing.md' with { loader: 'text' };
import keys from './topics/keys.md' with { loader: 'text' };
import report from './topics/report.md' with { loader: 'text' };
import wording from './topics/wording.md' with { loader: 'text' };

/** A page of the help: its part of the address, its name in the list, its Markdown. */
export interface HelpTopic {
  readonly path: string;
  readonly name: string;
  readonly text: string;
}

/** Every topic, in reading order. */
export const HELP_TOPICS: readonly HelpTopic[] = [
  { path: 'begin', name: 'Begin here', text: begin },
  { path: 'data', name: 'Load data', text: data },
  { path: 'code-book', name: 'The code book', text: codeBook },
  { path: 'analyses', name: 'Analyses', text: analyses },
  { path: 'intervals', name: 'Intervals compared', text: coverage },
  { path: 'report', name: 'The report', text: report },
  { path: 'framing', name: 'Both ways', text: framing },
  { path: 'wording', name: 'How sentences are worded', text: wording },
  { path: 'cautions', name: 'Cautions', text: cautions },
  { path: 'keys', name: 'Keys and access', text: keys },
];
