import { ChangeDetectionStrategy, Component, computed, inject, type OnInit } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Bar, BarActions } from '../ui/bar/bar';
import { NOW } from '../ui/clock';
import { isoDay, longDate } from '../ui/dates';
import { EmptyState } from '../ui/status/empty-state';
import { ProblemPanel } from '../ui/status/problem-panel';
import { counted } from '../ui/words';
import { DeskDialogs } from './desk-dialogs';
import { DeskReports } from './desk-reports';
import { DeskShelf } from './desk-shelf';
import { DeskStore } from './desk-store';
import { DeskWeek } from './desk-week';
import { FindBox } from './find-box';

/** What waits for a person, their week, the reports they work on and their studies. */
@Component({
  selector: 'eh-desk-page',
  imports: [
    Bar,
    BarActions,
    DeskReports,
    DeskShelf,
    DeskWeek,
    EmptyState,
    FindBox,
    ProblemPanel,
    RouterLink,
  ],
  providers: [DeskStore, DeskDialogs],
  templateUrl: './desk-page.html',
  styleUrl: './desk-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskPage implements OnInit {
  private readonly now = inject(NOW)();
  protected readonly desk = inject(DeskStore);
  protected readonly dialogs = inject(DeskDialogs);

  protected readonly date = longDate(this.now);
  protected readonly today = isoDay(this.now);
  protected readonly headline = computed(() => {
    const count = this.desk.waiting().length;
    if (count === 0) return 'Nothing waits for you';
    return `${counted(count, 'thing waits', 'things wait')} for you`;
  });

  ngOnInit(): void {
    this.desk.load();
  }
}
