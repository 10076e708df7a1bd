import { inject } from '@angular/core';
import { type CanActivateFn, RedirectCommand, Router } from '@angular/router';
import { catchError, map, of, throwError } from 'rxjs';
import { ApiProblem } from '../server-api/api-problem';
import { CurrentStudy } from './current-study';

/** Opens the study that the address names before anything of it is shown. */
export const studyGuard: CanActivateFn = (route) => {
  const notHere = new RedirectCommand(inject(Router).parseUrl('/not-here'), {
    skipLocationChange: true,
  });
  return inject(CurrentStudy)
    .open(route.paramMap.get('studyId') ?? '')
    .pipe(
      map(() => true),
      catchError((failure: unknown) =>
        ApiProblem.from(failure).status === 404 ? of(notHere) : throwError(() => failure),
      ),
    );
};

/** Closes the study that was open: the desk stands above all studies. */
export const leaveStudyGuard: CanActivateFn = () => {
  inject(CurrentStudy).close();
  return true;
};
