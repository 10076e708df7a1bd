import { DOCUMENT, inject } from '@angular/core';
import type { Framing } from '#shared/wording';
import { CurrentStudy } from '../../session/current-study';
import type { KeyCommand } from '../../ui/keys/key-command';
import { keyCommands } from '../../ui/keys/key-commands';
import { BlockActions } from '../block-actions/block-actions';
import { CheckWalk } from '../checks/check-walk';
import { SourceReader } from '../margins/source-reader';
import { ProofDesk } from '../proof/proof-desk';
import { ReverseContrast } from '../reverse-contrast/reverse-contrast';
import { ReportFraming } from './report-framing';
import { UndoActions } from './undo-actions';

/** Where single keys and arrows belong to the control itself. */
const CONTROLS = 'input, select, textarea, [contenteditable=true], [role=menuitem]';

/** The keys of the proof. They act on the block in hand, never inside text or a control. */
export function workspaceKeys(): void {
  const document = inject(DOCUMENT);
  const desk = inject(ProofDesk);
  const study = inject(CurrentStudy);
  const edits = study.may('editWordsBlocks');
  const frames = study.may('setFraming');
  const free = (): boolean => document.activeElement?.matches(CONTROLS) !== true;
  const idle = (): boolean => free() && desk.editing() === null;
  keyCommands([
    ...only(() => idle(), walkKeys(desk)),
    ...(edits ? only(() => idle() && desk.selected() !== null, blockKeys(desk)) : []),
    ...(edits ? only(() => idle() && onBlock(document), wholeBlockKeys(desk)) : []),
    ...(frames ? only(free, framingKeys()) : []),
    ...only(free, checkKeys()),
    ...(edits ? only(free, undoKeys()) : []),
  ]);
}

type Key = Omit<KeyCommand, 'group'>;

function only(active: () => boolean, keys: readonly Key[]): readonly KeyCommand[] {
  return keys.map((key) => ({ ...key, group: 'Report', active }));
}

function onBlock(document: Document): boolean {
  return document.activeElement?.matches('eh-proof-block') === true;
}

function walkKeys(desk: ProofDesk): readonly Key[] {
  const go = (step: 1 | -1) => () => {
    const next = desk.neighbour(step);
    if (next !== null) desk.select(next);
  };
  return [
    { key: 'Up', says: 'Blocks', inStrip: true, run: go(-1) },
    { key: 'Down', says: 'Blocks', inStrip: true, run: go(1) },
  ];
}

function blockKeys(desk: ProofDesk): readonly Key[] {
  const actions = inject(BlockActions);
  const contrast = inject(ReverseContrast);
  const shift = (step: 1 | -1): (() => void) =>
    inHand(desk, (blockId) => {
      actions.shift(blockId, step);
    });
  const reverse = inHand(desk, (blockId) => {
    contrast.reverse(blockId);
  });
  return [
    { key: 'Alt Up', says: 'Move the block', run: shift(-1) },
    { key: 'Alt Down', says: 'Move the block', run: shift(1) },
    { key: 'X', says: 'Reverse the contrast', run: reverse },
  ];
}

function wholeBlockKeys(desk: ProofDesk): readonly Key[] {
  const actions = inject(BlockActions);
  const open = inHand(desk, (blockId) => {
    if (actions.mayChange(blockId)) desk.edit(blockId);
  });
  const remove = inHand(desk, (blockId) => {
    actions.remove(blockId);
  });
  return [
    { key: 'Enter', says: 'Open the block', inStrip: true, run: open },
    { key: 'Delete', says: 'Remove the block', run: remove },
  ];
}

function inHand(desk: ProofDesk, act: (blockId: string) => void): () => void {
  return () => {
    const blockId = desk.selected();
    if (blockId !== null) act(blockId);
  };
}

const FRAMING_KEYS: readonly (readonly [string, Framing])[] = [
  ['A', 'absolute'],
  ['B', 'both'],
  ['R', 'relative'],
];

function framingKeys(): readonly Key[] {
  const framing = inject(ReportFraming);
  return FRAMING_KEYS.map(([key, said]) => ({
    key,
    says: 'Framing',
    inStrip: true,
    run: () => {
      framing.sayInHand(said);
    },
  }));
}

function checkKeys(): readonly Key[] {
  const walk = inject(CheckWalk);
  const sources = inject(SourceReader);
  const step = (by: 1 | -1) => () => {
    walk.step(by);
  };
  const show = (): void => {
    sources.show();
  };
  return [
    { key: '.', says: 'Next check', inStrip: true, run: step(1) },
    { key: ',', says: 'Check before', run: step(-1) },
    { key: 'P', says: 'Show where a number is from', inStrip: true, run: show },
  ];
}

function undoKeys(): readonly Key[] {
  const undo = inject(UndoActions);
  const run = (event: KeyboardEvent): void => {
    if (event.shiftKey) undo.redo();
    else undo.undo();
  };
  const redo = (): void => {
    undo.redo();
  };
  return [
    { key: 'Ctrl Z', says: 'Undo; with Shift, do again', run },
    { key: 'Ctrl Y', says: 'Do again', run: redo },
  ];
}
