import { TestBed } from '@angular/core/testing';
import { of, throwError } from 'rxjs';
import type { Problem } from '@seamwright/shared/contracts';
import { ApiProblem } from '@seamwright/shared/data-access';
import type { PersonView } from '@seamwright/identity/contracts';
import { PeopleApi } from './people.api';
import { PeopleEditor } from './people-editor';

const jo = { id: 'jo', name: 'Jo Marsh', rowVersion: 3 } as PersonView;
const typed = {
  email: 'jo@anchor.example',
  name: 'Joan Marsh',
  roles: ['buyer' as const],
  sites: '*' as const,
  customers: '*' as const,
  active: true,
};
const refusal = (status: number, code: string) =>
  throwError(
    () => new ApiProblem({ type: '', title: '', status, detail: '', instance: '', code, errors: [] } as Problem),
  );

const api = { list: jest.fn(), get: jest.fn(), invite: jest.fn(), update: jest.fn() };
let editor: PeopleEditor;

beforeEach(() => {
  jest.resetAllMocks();
  api.list.mockReturnValue(of({ items: [jo], nextCursor: null }));
  TestBed.configureTestingModule({ providers: [PeopleEditor, { provide: PeopleApi, useValue: api }] });
  editor = TestBed.inject(PeopleEditor);
  editor.open({ customerId: 'anchor' });
});

describe('changing a person', () => {
  it('saves by the version that was read, closes the form, and lists anew', () => {
    api.update.mockReturnValue(of({ ...jo, name: 'Joan Marsh' }));
    editor.begin(jo);
    editor.save(typed);
    expect(api.update).toHaveBeenCalledWith('jo', expect.objectContaining({ name: 'Joan Marsh' }), 3);
    expect(editor.editing()).toBeNull();
    expect(editor.done()).toEqual({ kind: 'saved', name: 'Joan Marsh' });
    expect(api.list).toHaveBeenCalledTimes(2);
  });

  it('offers the newer state when somebody else saved first, and saves over it only when asked again', () => {
    const now = { ...jo, name: 'Jo Harlow', rowVersion: 4 };
    api.update.mockReturnValueOnce(refusal(412, 'stale'));
    api.get.mockReturnValue(of(now));
    editor.begin(jo);
    editor.save(typed);
    // The form still edits the person that was read, so what was typed stays in it.
    expect(editor.editing()).toBe(jo);
    expect(editor.newer()).toEqual({ read: jo, now });
    expect(editor.refused()).toBeNull();

    editor.keepMine();
    api.update.mockReturnValue(of(jo));
    editor.save(typed);
    expect(api.update).toHaveBeenLastCalledWith('jo', expect.anything(), 4);
  });

  it('takes the newer state into the form', () => {
    const now = { ...jo, name: 'Jo Harlow', rowVersion: 4 };
    api.update.mockReturnValue(refusal(412, 'stale'));
    api.get.mockReturnValue(of(now));
    editor.begin(jo);
    editor.save(typed);
    editor.takeNewer();
    expect(editor.editing()).toBe(now);
    expect(editor.newer()).toBeNull();
  });
});

describe('inviting', () => {
  const keys = () => api.invite.mock.calls.map(([, key]) => key as string);

  it('tries again with the same key after a lost answer, and with another after a refusal', () => {
    editor.begin('new');
    api.invite.mockReturnValueOnce(refusal(0, 'offline')).mockReturnValueOnce(refusal(422, 'email-taken'));
    editor.save(typed);
    editor.save(typed);
    api.invite.mockReturnValue(of(jo));
    editor.save(typed);
    const [lost, refused, last] = keys();
    expect(refused).toBe(lost);
    expect(last).not.toBe(refused);
    expect(editor.done()?.kind).toBe('invited');
  });

  it('invites to the customer whose people are shown', () => {
    api.invite.mockReturnValue(of(jo));
    editor.begin('new');
    editor.save(typed);
    expect(api.invite).toHaveBeenCalledWith(expect.objectContaining({ customerId: 'anchor' }), expect.any(String));
    expect(api.invite.mock.calls[0]?.[0]).not.toHaveProperty('active');
  });
});
