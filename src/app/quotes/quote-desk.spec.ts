import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { lineFactory, quoteFactory } from '../../../test/factories/quote-factory';
import { changeLine } from './line-edits';
import { QuoteDesk } from './quote-desk';

const url = '/api/quotes/q1/lines';
/** Lets the promises of the desk run. */
const settled = () => new Promise((done) => setTimeout(done));

describe('QuoteDesk', () => {
  let desk: QuoteDesk;
  let http: HttpTestingController;
  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [QuoteDesk, provideHttpClient(), provideHttpClientTesting()] });
    desk = TestBed.inject(QuoteDesk);
    http = TestBed.inject(HttpTestingController);
    desk.use('q1');
    TestBed.tick();
    http.expectOne('/api/quotes/q1').flush(quoteFactory());
  });
  afterEach(() => http.verify());

  it('removes a line, and puts it back where it stood', async () => {
    const removing = desk.remove(desk.quote()!.lines[1]!);
    const first = http.expectOne(url);
    expect(first.request.body.lines.map(({ id }: { id: string }) => id)).toEqual(['a', 'c']);
    first.flush(quoteFactory({ revision: 2, lines: [lineFactory({ id: 'a' }), lineFactory({ id: 'c' })] }));
    expect(await removing).toBeNull();
    expect(desk.removed()?.index).toBe(1);

    const puttingBack = desk.putBack();
    const second = http.expectOne(url);
    expect(second.request.body.revision).toBe(2);
    expect(second.request.body.lines.map(({ tag }: { tag: string }) => tag)).toEqual(['tag a', 'tag b', 'tag c']);
    second.flush(quoteFactory({ revision: 3 }));
    expect(await puttingBack).toBeNull();
    expect(desk.removed()).toBeNull();
    expect(desk.quote()!.lines).toHaveLength(3);
  });

  it('offers to put the line back again when that was refused', async () => {
    const removing = desk.remove(desk.quote()!.lines[0]!);
    http.expectOne(url).flush(quoteFactory({ revision: 2, lines: [lineFactory({ id: 'b' }), lineFactory({ id: 'c' })] }));
    await removing;
    const puttingBack = desk.putBack();
    http.expectOne(url).error(new ProgressEvent('error'));
    expect((await puttingBack)?.status).toBe(0);
    expect(desk.removed()?.line.id).toBe('a');
  });

  it('sends one change after the other, each with the revision the one before answered', async () => {
    const first = desk.editLines(changeLine('a', { quantity: 1 }));
    const second = desk.editLines(changeLine('b', { quantity: 2 }));
    expect(desk.saving()).toBe(true);
    const [one, ...early] = http.match(url);
    expect(early).toHaveLength(0);
    expect(one!.request.body.revision).toBe(1);
    one!.flush(
      quoteFactory({ revision: 2, lines: [lineFactory({ id: 'a', quantity: 1 }), lineFactory({ id: 'b' }), lineFactory({ id: 'c' })] }),
    );
    await first;
    const two = http.expectOne(url);
    expect(two.request.body.revision).toBe(2);
    expect(two.request.body.lines.map(({ quantity }: { quantity: number }) => quantity)).toEqual([1, 2, 6]);
    two.flush(quoteFactory({ revision: 3 }));
    await second;
    await settled();
    expect(desk.saving()).toBe(false);
  });

  it('says that somebody changed the quote meanwhile, and goes on after reading it again', async () => {
    const saving = desk.saveDetails({ notes: 'Scaffold on the south side' });
    const refusal = { type: 'https://sealyard.example/problems/changed-meanwhile', title: 'Changed', status: 409, detail: 'Changed.' };
    http.expectOne('/api/quotes/q1').flush(refusal, { status: 409, statusText: 'Conflict' });
    expect((await saving)?.code).toBe('changed-meanwhile');
    expect(desk.changedMeanwhile()).toBe(true);

    desk.readAgain();
    TestBed.tick();
    http.expectOne('/api/quotes/q1').flush(quoteFactory({ revision: 7 }));
    expect(desk.changedMeanwhile()).toBe(false);
    void desk.saveDetails({ notes: 'Scaffold on the south side' });
    expect(http.expectOne('/api/quotes/q1').request.body.revision).toBe(7);
  });
});
