import { TestBed } from '@angular/core/testing';
import { SectionPicker } from './section-picker';
import { SectionPickerHarness } from './testing/section-picker-harness';

const lines = ['UC 254x254x73', 'UC 254x254x89'].map((designation) => ({
  designation,
  mass: { value: 88.9 },
  dimensions: { h: { value: 260.3 }, b: { value: 256.3 } },
}));

describe('the section picker', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  function picker(sections: jest.Mock) {
    const fixture = TestBed.createComponent(SectionPicker);
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
