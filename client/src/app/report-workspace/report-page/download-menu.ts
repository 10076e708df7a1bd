import { ChangeDetectionStrategy, Component, DOCUMENT, inject, input, signal } from '@angular/core';
import { toObservable } from '@angular/core/rxjs-interop';
import { MatMenuModule } from '@angular/material/menu';
import { filter, finalize, mergeMap, take } from 'rxjs';
import { saveFile } from '../../server-api/downloaded-file';
import { type DraftFormat, ReportsApi } from '../../server-api/reports-api';
import { Icon } from '../../ui/marks/icon';
import { Notices } from '../../ui/notices/notices';
import { TextEditSession } from '../block-editors/text-edit-session';
import { ReportState } from '../report-store/report-state';
import { ReportSync } from '../report-store/report-sync';

interface Download {
  readonly format: DraftFormat;
  readonly name: string;
  readonly holds: string;
}

const DOWNLOADS: readonly Download[] = [
  { format: 'docx', name: 'Manuscript (DOCX)', holds: 'Text, tables and figures as they stand' },
  { format: 'xlsx', name: 'Tables and values (XLSX)', holds: 'Every table, every value in full' },
];

/** Downloads the draft. What is not saved yet is sent first, so that the file holds it. */
@Component({
  selector: 'eh-download-menu',
  imports: [Icon, MatMenuModule],
  template: `
    <button
      type="button"
      class="button"
      [class.primary]="look() === 'primary'"
      [class.small]="look() === 'small'"
      [matMenuTriggerFor]="menu"
      [disabled]="making() !== null"
    >
      {{ making() ?? 'Download' }}
      <eh-icon name="down" />
    </button>
    <mat-menu #menu="matMenu" xPosition="before">
      @for (each of downloads; track each.format) {
        <button mat-menu-item (click)="download(each)">
          <span class="described">
            <b>{{ each.name }}</b>
            <small>{{ each.holds }}</small>
          </span>
        </button>
      }
    </mat-menu>
  `,
  styleUrl: '../block-actions/described-item.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DownloadMenu {
  private readonly document = inject(DOCUMENT);
  private readonly api = inject(ReportsApi);
  private readonly state = inject(ReportState);
  private readonly sync = inject(ReportSync);
  private readonly session = inject(TextEditSession);
  private readonly notices = inject(Notices);
  private readonly allSent = toObservable(this.sync.allSent);

  readonly look = input<'primary' | 'small'>('primary');

  protected readonly downloads = DOWNLOADS;
  protected readonly making = signal<string | null>(null);

  protected download({ format }: Download): void {
    const place = this.state.place();
    if (place === null) return;
    this.session.commit();
    this.making.set(`Making the ${format.toUpperCase()}`);
    this.allSent
      .pipe(
        filter((sent) => sent),
        take(1),
        mergeMap(() => this.api.download(place.studyId, place.reportId, format)),
        finalize(() => {
          this.making.set(null);
        }),
      )
      .subscribe({
        next: (file) => {
          saveFile(file, this.document);
        },
        error: (failure: unknown) => {
          this.notices.refuse(failure);
        },
      });
  }
}
