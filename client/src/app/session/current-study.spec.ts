import { TestBed } from '@angular/core/testing';
import type { StudyView } from '#shared/api';
import { STUDY_ROLES, type StudyRole } from '#shared/permissions';
import { of, throwError } from 'rxjs';
import { beforeEach, expect, it, vi } from 'vitest';
import { StudiesApi } from '../server-api/studies-api';
import { CurrentStudy } from './current-study';

const read = vi.fn();
let current: CurrentStudy;

beforeEach(() => {
  TestBed.configureTestingModule({
    providers: [{ provide: StudiesApi, useValue: { read } }],
  });
  current = TestBed.inject(CurrentStudy);
});

function study(id: string, role: StudyRole): StudyView {
  return { id, role, title: 'Wet work' } as StudyView;
}

it('allows nothing while no study is open', () => {
  expect([current.role(), current.may('readStudy')]).toEqual([null, false]);
});

it('follows the one table of permissions', () => {
  const editors = STUDY_ROLES.filter((role) => {
    current.take(study('s1', role));
    return current.may('editData');
  });
  expect(editors).toEqual(['analyst', 'lead']);
});

it('does not show one study while another opens, nor after it could not be opened', () => {
  current.take(study('s1', 'lead'));
  read.mockReturnValue(throwError(() => new Error('not found')));
  current.open('s2').subscribe({ error: () => undefined });
  expect(current.study()).toBeNull();
});

it('keeps the study in view while it is read afresh', () => {
  current.take(study('s1', 'lead'));
  const fresh = study('s1', 'reader');
  read.mockReturnValue(of(fresh));
  const answer = current.open('s1');
  expect(current.role()).toBe('lead');
  answer.subscribe();
  expect(current.role()).toBe('reader');
});
