import { inject } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';
import { filter, map, merge, mergeMap, of, take, timer } from 'rxjs';
import { Confirm } from '../../ui/dialog/confirm';
import type { ReportWorkspacePage } from './report-workspace-page';

const PATIENCE_MILLISECONDS = 3_000;
const LOOK_MILLISECONDS = 100;

/** Lets a person leave once all is saved; asks first when that takes too long. */
export const leaveReportGuard: CanDeactivateFn<ReportWorkspacePage> = (page) => {
  const confirm = inject(Confirm);
  const saved = timer(0, LOOK_MILLISECONDS).pipe(
    filter(() => page.readyToLeave()),
    map(() => true),
  );
  const tooLong = timer(PATIENCE_MILLISECONDS).pipe(map(() => false));
  return merge(saved, tooLong).pipe(
    take(1),
    mergeMap((ready) =>
      ready
        ? of(true)
        : confirm.ask({
            question: 'Leave before everything is saved?',
            consequence:
              'Your work is kept in this browser and sent when you open the report again. Others do not see it before.',
            keep: 'Stay here',
            act: 'Leave the report',
          }),
    ),
  );
};
