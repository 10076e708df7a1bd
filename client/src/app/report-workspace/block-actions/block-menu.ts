import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { KeyLabel } from '../../ui/keys/key-label';
import { Icon } from '../../ui/marks/icon';
import { ReverseContrast } from '../reverse-contrast/reverse-contrast';
import { BlockActions } from './block-actions';

/** The handle of a block: drag it to move the block, press it for everything else. */
@Component({
  selector: 'eh-block-menu',
  imports: [Icon, KeyLabel, MatMenuModule],
  template: `
    <button type="button" class="text-button" (click)="opened.emit()">Open</button>
    <button
      type="button"
      class="icon-button"
      [matMenuTriggerFor]="menu"
      [attr.aria-label]="name() + ': move, open, remove'"
      title="Drag to move, press for more"
    >
      <eh-icon name="drag" />
    </button>
    <mat-menu #menu="matMenu">
      <button mat-menu-item (click)="opened.emit()">Open <eh-key-label key="Enter" /></button>
      <button mat-menu-item (click)="actions.shift(blockId(), -1)">
        Move up <eh-key-label key="Alt Up" />
      </button>
      <button mat-menu-item (click)="actions.shift(blockId(), 1)">
        Move down <eh-key-label key="Alt Down" />
      </button>
      @if (mayReverse()) {
        <button mat-menu-item (click)="contrast.reverse(blockId())">
          Reverse the contrast <eh-key-label key="X" />
        </button>
      }
      <button mat-menu-item (click)="actions.remove(blockId())">
        Remove <eh-key-label key="Delete" />
      </button>
    </mat-menu>
  `,
  styles: `
    .icon-button {
      width: 24px;
      color: var(--ink-3);
      cursor: grab;
    }
    .text-button {
      display: none;
    }
    @media (max-width: 719px) {
      :host {
        display: flex;
        justify-content: space-between;
        align-items: center;
        width: 100%;
      }
      .text-button {
        display: inline-flex;
      }
    }
    [mat-menu-item] eh-key-label {
      margin-left: 24px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BlockMenu {
  protected readonly actions = inject(BlockActions);
  protected readonly contrast = inject(ReverseContrast);

  readonly blockId = input.required<string>();
  readonly name = input.required<string>();
  readonly opened = output();

  protected readonly mayReverse = computed(() => this.contrast.possible(this.blockId()));
}
