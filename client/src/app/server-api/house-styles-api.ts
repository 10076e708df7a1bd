import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { HouseStyle } from '#shared/house-style';
import type { Observable } from 'rxjs';

/** House styles that reports may use. */
@Injectable({ providedIn: 'root' })
export class HouseStylesApi {
  private readonly http = inject(HttpClient);

  list(): Observable<HouseStyle[]> {
    return this.http.get<HouseStyle[]>('/api/house-styles');
  }
}
