import { TestBed } from '@angular/core/testing';
import { SectionPicker } from './section-picker';
import { SectionPickerHarness } from './testing/section-picker-harness';

const lines = ['UC 254x254x73', 'UC 254x254x89'].map((designation) => ({
  designation,
  mass: { value: 88.9 },
  dimensions: { h: { value: 260.3 }, b: { value: 256.3 } },
}));

const upn = { dimensions: { h: { value: 200 }, b: { value: 75 } } };

describe('the section picker', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  function picker(sections: jest.Mock, shapes: readonly string[] = []) {
    const fixture = TestBed.createComponent(SectionPicker);
    fixture.componentRef.setInput('shapes', shapes);
    fixture.componentRef.setInput('client', { sections });
    const pending: boolean[] = [];
    fixture.componentInstance.pending.subscribe((now) => pending.push(now));
    fixture.detectChanges();
    const harness = new SectionPickerHarness(fixture.nativeElement as Element);
    const type = async (text: string) => {
      harness.write('Section', text);
      await jest.advanceTimersByTimeAsync(250);
      fixture.detectChanges();
    };
    const key = (name: string) => {
      harness.key(name);
      fixture.detectChanges();
    };
    return { harness, pending, type, key, text: () => fixture.componentInstance.text() };
  }

  it('searches what is typed and is picked from by the keyboard', async () => {
    const sections = jest.fn().mockResolvedValue(lines);
    const { harness, type, key, text } = picker(sections);
    await type('uc254');
    expect(sections).toHaveBeenCalledWith('uc254');
    expect(harness.options[1]).toBe('UC 254x254x89 88.9 kg/m, 260.3 × 256.3');
    expect(harness.input.getAttribute('aria-expanded')).toBe('true');
    key('ArrowDown');
    key('ArrowDown');
    expect(harness.active).toContain('UC 254x254x89');
    expect(text()).toBe('');
    key('Enter');
    expect(text()).toBe('UC 254x254x89');
    expect(harness.options).toEqual([]);
  });

  it('asks for the shapes that it is to offer, and for no others', async () => {
    const sections = jest.fn().mockResolvedValue(lines);
    await picker(sections, ['I']).type('uc254');
    expect(sections.mock.calls).toEqual([['uc254', 'I']]);
  });

  it('says of a section what its name does not', async () => {
    const found = [
      {
        designation: 'SHS 150x150x8',
        shape: 'RHS',
        forming: 'hot-finished',
        mass: { value: 35.1 },
      },
      { designation: 'UPN 200', shape: 'channel', mass: { value: 25.3 }, ...upn },
      { designation: 'L 150x100x12', shape: 'angle', mass: { value: 22.5 } },
      { designation: 'timber 47x150', shape: 'rectangle', mass: null },
    ];
    const { harness, type } = picker(jest.fn().mockResolvedValue(found));
    await type('150');
    expect(harness.options).toEqual([
      'SHS 150x150x8 35.1 kg/m, hot-finished',
      'UPN 200 25.3 kg/m, 200 × 75',
      'L 150x100x12 22.5 kg/m',
      'timber 47x150',
    ]);
  });

  it('says so while what is typed does not count yet', async () => {
    const { type, key, pending } = picker(jest.fn().mockResolvedValue(lines));
    await type('uc254');
    expect(pending.at(-1)).toBe(true);
    key('ArrowDown');
    key('Enter');
    expect(pending.at(-1)).toBe(false);
  });

  it('closes on Escape and keeps what is typed', async () => {
    const { harness, type, key } = picker(jest.fn().mockResolvedValue(lines));
    await type('uc254');
    key('Escape');
    expect(harness.options).toEqual([]);
    expect(harness.input.value).toBe('uc254');
  });

  it('takes the text as it stands where the catalogue is away', async () => {
    const { type, text } = picker(jest.fn().mockRejectedValue(new Error('away')));
    await type('457 x 191 x 67 UB');
    expect(text()).toBe('457 x 191 x 67 UB');
  });

  it('takes the text when the field is left', async () => {
    const { harness, type, text } = picker(jest.fn().mockResolvedValue(lines));
    await type('uc 254x254x89');
    harness.leave();
    expect(text()).toBe('uc 254x254x89');
  });
});
