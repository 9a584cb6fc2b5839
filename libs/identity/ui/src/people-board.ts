import { DatePipe } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  untracked,
  type Signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Person } from '@seamwright/identity/domain';
import { Card, Chip, Confirm, Empty, ErrorState, Icon, Toast, type ProblemText } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { differences } from './differences';
import { NewerState } from './newer-state';
import { PersonForm, type PersonFormValue } from './person-form';
import { personStateName, personStateTone, roleName } from './person-words';

interface ListedPerson extends Person {
  readonly lastSeenAt: string | null;
}

/** What the board shows and asks for; the page brings one. */
export interface PeopleDesk {
  readonly people: Signal<readonly ListedPerson[] | null>;
  readonly hasMore: Signal<boolean>;
  readonly loading: Signal<boolean>;
  readonly problem: Signal<ProblemText | null>;
  readonly editing: Signal<ListedPerson | 'new' | null>;
  readonly saving: Signal<boolean>;
  readonly refused: Signal<ProblemText | null>;
  readonly newer: Signal<{ readonly read: Person; readonly now: Person } | null>;
  readonly done: Signal<{ readonly kind: string; readonly name: string } | null>;
  load(): void;
  more(): void;
  begin(person: Person | 'new'): void;
  leave(): void;
  save(value: PersonFormValue): void;
  takeNewer(): void;
  keepMine(): void;
  inviteAgain(person: Person): void;
  endSessions(person: Person): void;
}

/** People in a table, and above it the form for the one who is being invited or changed. */
@Component({
  selector: 'sw-people-board',
  imports: [Card, Chip, DataTable, DatePipe, Empty, ErrorState, Icon, MatButton, NewerState, PersonForm, TableCell],
  templateUrl: './people-board.html',
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 24px;
    }

    .more {
      padding: 12px 16px;
    }

    .below {
      margin-block-start: 16px;
      border-block-start: 1px solid var(--sw-line);
      padding-block-start: 16px;
    }

    // As high as its row, so that its word stands on the row's line and ends at the table's edge.
    .edit {
      margin: calc(var(--sw-cell-block) * -1) -10px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PeopleBoard {
  readonly desk = input.required<PeopleDesk>();
  readonly heading = input.required<string>();
  /** Whose people they are: the staff, or a customer's. */
  readonly customerId = input.required<string | null>();
  readonly sites = input<readonly { readonly id: string; readonly name: string }[]>([]);
  readonly customers = input<readonly { readonly id: string; readonly name: string }[]>([]);
  readonly emptyText = input('');

  readonly #toast = inject(Toast);
  readonly #confirm = inject(Confirm);
  protected readonly columns: readonly TableColumn<ListedPerson>[] = [
    { key: 'name', label: $localize`:@@identity.person.name:Name`, kind: 'text', sortable: true },
    { key: 'email', label: $localize`:@@identity.person.email:E-mail`, kind: 'text' },
    {
      key: 'roles',
      label: $localize`:@@identity.person.rolesShort:Roles`,
      kind: 'text',
      value: ({ roles }) => roles.map(roleName).join(', '),
    },
    { key: 'state', label: $localize`:@@identity.person.state:State`, kind: 'template' },
    { key: 'seen', label: $localize`:@@identity.person.seen:Last here`, kind: 'template' },
    { key: 'acts', label: $localize`:@@identity.person.acts:Change`, kind: 'template', align: 'end' },
  ];
  protected readonly rowId = ({ id }: ListedPerson) => id;
  protected readonly changing = computed(() => {
    const editing = this.desk().editing();
    return editing === 'new' ? null : editing;
  });
  protected readonly formHeading = computed(
    () => this.changing()?.name ?? $localize`:@@identity.person.inviteHeading:Invite somebody`,
  );
  protected readonly newerValues = computed(() => {
    const newer = this.desk().newer();
    return newer ? this.#differences(newer.read, newer.now) : [];
  });
  protected readonly stateName = personStateName;
  protected readonly stateTone = personStateTone;

  constructor() {
    effect(() => {
      const done = this.desk().done();
      if (done) untracked(() => void this.#toast.show({ text: sayDone(done.kind, done.name) }));
    });
  }

  protected asPerson(row: unknown): ListedPerson {
    return row as ListedPerson;
  }

  protected async signOut(person: Person): Promise<void> {
    const sure = await this.#confirm.ask({
      heading: $localize`:@@identity.person.signOutHeading:Sign ${person.name}:name: out everywhere?`,
      text: $localize`:@@identity.person.signOutText:Every browser is signed out within ten minutes. They can sign in again.`,
      act: $localize`:@@identity.person.signOut:Sign out everywhere`,
    });
    if (sure) this.desk().endSessions(person);
  }

  #differences(read: Person, now: Person) {
    const some = (ids: Person['sites']) =>
      ids === '*' ? $localize`:@@identity.all:all` : $localize`:@@identity.some:${ids.length}:count: chosen`;
    return differences(read, now, [
      { key: 'name', label: $localize`:@@identity.person.name:Name` },
      {
        key: 'roles',
        label: $localize`:@@identity.person.rolesShort:Roles`,
        say: ({ roles }) => roles.map(roleName).join(', '),
      },
      { key: 'sites', label: $localize`:@@identity.sites:Sites`, say: ({ sites }) => some(sites) },
      { key: 'customers', label: $localize`:@@identity.customers:Customers`, say: ({ customers }) => some(customers) },
      {
        key: 'state',
        label: $localize`:@@identity.person.state:State`,
        say: ({ state }) => personStateName(state),
      },
    ]);
  }
}

function sayDone(kind: string, name: string): string {
  switch (kind) {
    case 'invited':
    case 'invited-again':
      return $localize`:@@identity.person.doneInvited:An invitation is on its way to ${name}:name:.`;
    case 'signed-out':
      return $localize`:@@identity.person.doneSignedOut:${name}:name: was signed out everywhere.`;
    default:
      return $localize`:@@identity.person.doneSaved:${name}:name: was saved.`;
  }
}
