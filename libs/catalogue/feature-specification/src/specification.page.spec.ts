import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { specificationEffects, specificationFeature } from '@seamwright/catalogue/data-access';
import { aPublicSpecification } from '@seamwright/catalogue/data-access/testing';
import { ChoiceHarness, QuantityHarness } from '@seamwright/shared/ui/forms';
import { SpecificationPage } from './specification.page';

describe('the page of a specification', () => {
  const open = async () => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        provideState(specificationFeature),
        provideEffects(specificationEffects),
      ],
    });
    const fixture = TestBed.createComponent(SpecificationPage);
    fixture.componentRef.setInput('code', 'BF-901');
    fixture.detectChanges();
    await Promise.resolve();
    const request = TestBed.inject(HttpTestingController).expectOne('/api/v1/specifications/BF-901');
    const host = fixture.nativeElement as HTMLElement;
    const text = () => host.textContent?.replace(/\s+/g, ' ') ?? '';
    return { fixture, request, text, host, loader: TestbedHarnessEnvironment.loader(fixture) };
  };

  it('shows numbers, method, cautions and what was agreed', async () => {
    const { fixture, request, text } = await open();
    request.flush(aPublicSpecification({ uneceItemSeen: false }));
    await fixture.whenStable();
    expect(text()).toContain('version 4');
    expect(text()).toContain('Cut across the grain.');
    expect(text()).toContain('Chain-mail glove on.');
    expect(text()).toContain('none declared');
    expect(text()).toContain('Chilled, keep at 0 to 4 °C');
    expect(text()).toContain('2140 from memory, not checked in the standard');
  });

  it('redraws and reweighs with what is chosen', async () => {
    const { fixture, request, host, loader } = await open();
    request.flush(aPublicSpecification());
    await fixture.whenStable();
    expect(host.querySelectorAll('sw-spec-drawing [data-part=fat]').length).toBeGreaterThan(0);

    const [trim] = await loader.getAllHarnesses(ChoiceHarness);
    await trim?.choose('0');
    expect(host.querySelectorAll('sw-spec-drawing [data-part=fat]')).toHaveLength(0);
    expect(fixture.componentInstance.resolved()?.choiceKey).toBe('finish=plain;trim=0');
  });

  it('counts cases as the pieces in them', async () => {
    const { fixture, request, loader } = await open();
    request.flush(aPublicSpecification());
    await fixture.whenStable();
    const choices = await loader.getAllHarnesses(ChoiceHarness);
    await choices.at(-1)?.choose('cases');
    expect(await loader.getHarness(QuantityHarness)).toBeTruthy();
    expect(fixture.componentInstance.weights()).toMatchObject({ pieces: 24, cases: 1, estimateGrams: 6720 });
  });

  it('says so when it was withdrawn, and does not offer to try again', async () => {
    const { fixture, request, host, text } = await open();
    const problem = {
      type: '',
      title: 'Not Found',
      status: 404,
      detail: 'BF-901 has been withdrawn',
      instance: '',
      code: 'x',
    };
    request.flush(problem, { status: 404, statusText: 'Not Found' });
    await fixture.whenStable();
    expect(text()).toContain('BF-901 has been withdrawn');
    expect(host.querySelector('sw-error button')).toBeNull();
  });
});
