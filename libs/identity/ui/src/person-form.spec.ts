import { TestBed } from '@angular/core/testing';
import type { Person } from '@seamwright/identity/domain';
import { PersonForm, type PersonFormValue } from './person-form';

const rep: Person = {
  id: 'rep',
  rowVersion: 1,
  email: 'robin@desk.example',
  name: 'Robin Reed',
  roles: ['rep'],
  customerId: null,
  sites: '*',
  customers: ['anchor'],
  state: 'active',
};

async function open(inputs: { person?: Person; customerId: string | null }) {
  const fixture = TestBed.createComponent(PersonForm);
  fixture.componentRef.setInput('customerId', inputs.customerId);
  fixture.componentRef.setInput('person', inputs.person ?? null);
  fixture.componentRef.setInput('customers', [{ id: 'anchor', name: 'The Blue Anchor' }]);
  fixture.componentRef.setInput('sites', [{ id: 'harbour', name: 'Harbour' }]);
  const saved: PersonFormValue[] = [];
  fixture.componentInstance.save.subscribe((value) => saved.push(value));
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const labels = () => [...page.querySelectorAll('mat-label')].map(({ textContent }) => textContent.trim());
  const tick = async (role: string) => {
    const box = [...page.querySelectorAll('mat-checkbox')].find(({ textContent }) => textContent.includes(role));
    box?.querySelector('input')?.click();
    await fixture.whenStable();
  };
  const type = (name: string, text: string) => {
    const field = page.querySelector<HTMLInputElement>(`[formControlName=${name}]`);
    if (!field) throw new Error(`No field ${name}`);
    field.value = text;
    field.dispatchEvent(new Event('input'));
  };
  const submit = async () => {
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    await fixture.whenStable();
  };
  return { page, labels, tick, type, submit, saved };
}

describe('the form for a person', () => {
  it('invites a buyer, who has one role', async () => {
    const { type, tick, submit, saved, labels } = await open({ customerId: 'anchor' });
    expect(labels()).toContain('Kept to these sites');
    type('email', 'New@Anchor.example');
    type('name', ' New Cook ');
    await tick('Account owner');
    expect(labels()).not.toContain('Kept to these sites');
    await submit();
    expect(saved).toEqual([
      {
        email: 'new@anchor.example',
        name: 'New Cook',
        roles: ['buyer_owner'],
        sites: '*',
        customers: '*',
        active: true,
      },
    ]);
  });

  it('keeps a rep to customers, but nobody who has another role too', async () => {
    const { labels, tick, submit, saved } = await open({ person: rep, customerId: null });
    expect(labels()).toContain('Serves these customers');
    await submit();
    expect(saved[0]?.customers).toEqual(['anchor']);
    await tick('Planner');
    expect(labels()).not.toContain('Serves these customers');
    await submit();
    expect(saved[1]).toMatchObject({ roles: ['rep', 'planner'], customers: '*' });
  });

  it('asks for a role before anything is sent', async () => {
    const { page, type, submit, saved } = await open({ customerId: null });
    type('email', 'new@desk.example');
    type('name', 'New');
    await submit();
    expect(saved).toEqual([]);
    expect(page.querySelector('.wrong')?.textContent).toContain('at least one role');
  });

  it('shows the address of somebody who is here already, not to be changed', async () => {
    const { page } = await open({ person: rep, customerId: null });
    expect(page.querySelector<HTMLInputElement>('[formControlName=email]')?.disabled).toBe(true);
  });
});
