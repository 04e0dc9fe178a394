import { describe, expect, it } from 'vitest';
import {
  applicationBody,
  applicationWishes,
  blankApplication,
  formFaults,
  textsOf,
} from '../../../../src/features/applications/model/application-texts';
import { besideTitle, linesWords, voltagesWords } from '../../../../src/features/applications/model/words';
import { anApplication } from './case';

const plain = (text: string | undefined) => text?.replace(/[\u2009\u202f]/g, ' ');

describe('the head of an application', () => {
  it('opens and gives the same request back', () => {
    const application = anApplication();
    expect(applicationBody(textsOf(application))).toEqual({
      title: 'Fellgate Wind',
      connectionKind: 'generation',
      capacityMw: 480,
      pointOfConnection: 'Sarn',
      contact: { name: 'P. Sandgate', email: 'p@fellgate.example', phone: null },
    });
    expect(Object.values(applicationWishes(textsOf(application))).filter(Boolean)).toEqual([]);
  });

  it('begins with whoever begins it, and says what it lacks', () => {
    const wishes = applicationWishes(blankApplication({ name: 'P', email: 'p@x.example' }));
    const lacking = Object.entries(wishes).filter(([, wish]) => wish !== undefined);
    expect(lacking.map(([name]) => name)).toEqual(['title', 'connectionKind', 'pointOfConnection']);
  });

  it.each(['480', '49.9', ''])('takes a capacity of “%s”', (capacityMw) => {
    expect(applicationWishes({ ...textsOf(anApplication()), capacityMw }).capacityMw).toBeUndefined();
  });

  it.each(['480 MW', '1,5', '-3'])('asks again for a capacity of “%s”', (capacityMw) => {
    expect(applicationWishes({ ...textsOf(anApplication()), capacityMw }).capacityMw).toMatch(/480 or 49\.9/);
  });

  it('names the server’s faults as the form does', () => {
    expect(formFaults({ 'contact.email': 'e', title: 't' })).toEqual({ contactEmail: 'e', title: 't' });
  });
});

describe('words beside an application', () => {
  it('name the place where the title does not', () => {
    expect(plain(besideTitle(anApplication()))).toBe('480 MW at Sarn');
    expect(besideTitle(anApplication({ title: 'Wind at Sarn' }))).toBeUndefined();
    expect(plain(besideTitle(anApplication({ title: 'Sarn Wind' })))).toBe('480 MW at Sarn');
    expect(besideTitle(anApplication({ capacityMw: null }))).toBe('at Sarn');
  });

  it('write numbers without zeros that nobody wrote', () => {
    expect(plain(voltagesWords([345, 132.5]))).toBe('345 kV, 132.5 kV');
    expect(plain(linesWords(5, 153.94))).toBe('5, together 153.9 km');
    expect(linesWords(1, 0)).toBe('1');
    expect(linesWords(0, 0)).toBe('none yet');
  });
});
