import { inject, Injectable } from '@angular/core';
import { MatSnackBar } from '@angular/material/snack-bar';
import { ApiProblem } from '../../server-api/api-problem';

const SHORT_MILLISECONDS = 5_000;
const WITH_ACTION_MILLISECONDS = 10_000;

/** One line at the foot that says what just happened. */
@Injectable({ providedIn: 'root' })
export class Notices {
  private readonly snackBar = inject(MatSnackBar);

  say(sentence: string): void {
    this.snackBar.open(sentence, undefined, { duration: SHORT_MILLISECONDS });
  }

  /** Says it and offers one way back, as in "Undo". */
  offer(sentence: string, verb: string, act: () => void): void {
    this.snackBar
      .open(sentence, verb, { duration: WITH_ACTION_MILLISECONDS })
      .onAction()
      .subscribe(act);
  }

  /** Says why something could not be done; stays until it is closed. */
  refuse(failure: unknown): void {
    const problem = ApiProblem.from(failure);
    this.snackBar.open(`${problem.title} ${problem.wayOut}`.trim(), 'Close', {
      politeness: 'assertive',
    });
  }
}
