/** The script that a page loads: makes the elements known to it, and nothing else. */
import { CSP_NONCE, Injector, provideZonelessChangeDetection } from '@angular/core';
import { createApplication } from '@angular/platform-browser';
import { HEADTREE_FETCH, SectionCheck, StressCheck, WalerCheck } from '@headtree/checks';
import { makeCheckElement } from './element/check-element';
import { fetchOrSayWhy } from './script/fetcher';
import { isTaken } from './script/taken';
import { readScript } from './script/script';

/** Every element of the script and the check it shows. */
const elements = {
  'headtree-waler': WalerCheck,
  'headtree-section': SectionCheck,
  'headtree-stress': StressCheck,
};

/** Only while the script itself runs does the page say which one it is. */
const script = readScript(document.currentScript);

async function start(): Promise<void> {
  const application = await createApplication({
    providers: [
      provideZonelessChangeDetection(),
      { provide: CSP_NONCE, useValue: script.nonce ?? null },
      { provide: HEADTREE_FETCH, useValue: fetchOrSayWhy },
    ],
  });
  const injector = application.injector.get(Injector);
  for (const [name, component] of Object.entries(elements)) {
    // Again: another copy may have come first while this one started.
    if (!isTaken(name)) customElements.define(name, makeCheckElement(component, script, injector));
  }
}

if (!Object.keys(elements).every(isTaken)) void start();
