import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { Router, RouterLink } from '@angular/router';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions } from '../../ui/bar/bar';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { FormProblems } from '../../ui/field/form-problems';
import { Notices } from '../../ui/notices/notices';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { checkedRows, type GridProblem, placeOfPath } from './checked-grid';
import { type CountsGrid, emptyGrid } from './counts-grid';
import { CountsGridEditor } from './counts-grid-editor';
import type { CountsLayout } from './counts-grid';

const MESSAGES = {
  dataSetName: { required: 'Give the data set a name.' },
  dataDate: { required: 'Give the date of the data, such as 2026-03-31.' },
  exposureLabel: { required: 'Say what the levels are of, as in "Wet work per shift".' },
  outcomeLabel: { required: 'Say what is counted, as in "Hand eczema".' },
};

/** Stores counts that are typed or pasted into a grid as a data cut. */
@Component({
  selector: 'eh-typed-counts-page',
  imports: [
    Bar,
    BarActions,
    CountsGridEditor,
    Field,
    FieldControl,
    ProblemPanel,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './typed-counts-page.html',
  styleUrl: './typed-counts-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TypedCountsPage {
  private readonly api = inject(DataApi);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  protected readonly study = inject(CurrentStudy).study;
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);

  protected readonly form = inject(NonNullableFormBuilder).group({
    dataSetName: ['', Validators.required],
    dataDate: ['', Validators.required],
    exposureLabel: ['', Validators.required],
    outcomeLabel: ['', Validators.required],
    stratumLabel: [''],
    layout: [this.study()?.design === 'caseControl' ? 'casesAndControls' : 'eventsAndTotal'],
  });
  protected readonly problems = new FormProblems(this.form, MESSAGES);
  protected readonly grid = signal<CountsGrid>(emptyGrid());
  protected readonly isSending = signal(false);
  private readonly isChecked = signal(false);
  private readonly refused = signal<ApiProblem | null>(null);
  private readonly layoutChoice = toSignal(this.form.controls.layout.valueChanges, {
    initialValue: this.form.controls.layout.value,
  });
  protected readonly layout = computed<CountsLayout>(() =>
    this.layoutChoice() === 'casesAndControls' ? 'casesAndControls' : 'eventsAndTotal',
  );
  private readonly rows = computed(() => checkedRows(this.grid(), this.layout()));

  /** Nothing is said before somebody asked to store; then it is said until it is mended. */
  protected readonly gridProblems = computed<readonly GridProblem[]>(() => {
    const rows = this.rows();
    if (!rows.ok) return this.isChecked() ? rows.issue : [];
    return (this.refused()?.fields ?? []).flatMap(({ path, message }) => {
      const place = placeOfPath(this.grid(), path);
      return place === null ? [] : [{ place, message }];
    });
  });
  protected readonly problem = this.problems.problem;

  protected type(grid: CountsGrid): void {
    this.grid.set(grid);
    this.refused.set(null);
  }

  protected store(): void {
    this.isChecked.set(true);
    const rows = this.rows();
    if (!this.problems.check() || !rows.ok) return;
    this.isSending.set(true);
    const { stratumLabel, ...words } = this.form.getRawValue();
    const request = {
      ...words,
      layout: this.layout(),
      stratumLabel: this.grid().stratified ? stratumLabel || 'Stratum' : null,
      rows: [...rows.value],
    };
    this.api.storeTypedCounts(this.study()?.id ?? '', request).subscribe({
      next: (cut) => {
        this.notices.say(`Cut ${cut.number} of ${cut.dataSetName} is made.`);
        void this.router.navigate([...this.home(), 'data', 'cuts', cut.id]);
      },
      error: (failure: unknown) => {
        this.refuse(ApiProblem.from(failure));
      },
    });
  }

  private refuse(problem: ApiProblem): void {
    this.isSending.set(false);
    this.refused.set(problem);
    this.problems.refuse(problem);
  }
}
