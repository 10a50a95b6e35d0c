import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import type { IssuedKey, Key } from './client';
import { KeyDialog } from './key-dialog';

const key: Key = {
  selector: '9Kq2vT7bXw3L',
  clientId: 'c1',
  kind: 'secret',
  label: 'Nightly schedule',
  scopes: ['checks'],
  origins: [],
  profiles: null,
  rateLimit: null,
  createdAt: '2026-12-01T12:00:00Z',
  expiresAt: null,
  revokedAt: null,
  lastUsedOn: null,
  state: 'live',
};

async function open(issued: IssuedKey) {
  const close = jest.fn();
  TestBed.configureTestingModule({
    providers: [
      provideZonelessChangeDetection(),
      { provide: MatDialogRef, useValue: { close } },
      { provide: MAT_DIALOG_DATA, useValue: { issued, profile: 'uk-na' } },
    ],
  });
  const fixture = TestBed.createComponent(KeyDialog);
  await fixture.whenStable();
  return { fixture, close, page: fixture.nativeElement as HTMLElement };
}

describe('the dialog of a new key', () => {
  const secret = { key, text: 'htk_9Kq2vT7bXw3L_secretsecret' };

  it('shows the key with a command that carries it, and says that it is the only time', async () => {
    const { page } = await open(secret);
    expect(page.querySelector('.key')?.textContent).toBe(secret.text);
    expect(page.querySelector('pre')?.textContent).toContain(`Bearer ${secret.text}`);
    expect(page.textContent).toContain('you will not see it again');
  });

  it('holds no more of it once it is closed', async () => {
    const { fixture, close, page } = await open(secret);
    page.querySelector<HTMLButtonElement>('mat-dialog-actions button')?.click();
    await fixture.whenStable();
    expect(close).toHaveBeenCalledWith();
    expect(page.textContent).not.toContain(secret.text);
  });

  it('gives a page key as markup for a page', async () => {
    const text = 'htp_9Kq2vT7bXw3L_pagepage';
    const origins = ['https://intranet.example'];
    const { page } = await open({ key: { ...key, kind: 'page', origins }, text });
    expect(page.querySelector('pre')?.textContent).toContain(`<headtree-waler key="${text}"`);
    expect(page.textContent).toContain('https://intranet.example');
  });
});
