import { inject, Injectable } from '@angular/core';
import { Api, segment } from '../../core/api/api';
import type { Page } from '../../core/api/page';
import type { Client, IssuedKey, Key, KeyRequest } from './client';

type ClientChange = Partial<Pick<Client, 'name' | 'defaultProfile'> & { disabled: boolean }>;

const most = 500;

/** Clients and their keys, as the service keeps them. */
@Injectable({ providedIn: 'root' })
export class ClientsApi {
  private readonly api = inject(Api);

  list(): Promise<Page<Client>> {
    return this.api.get('/v1/clients', { pageSize: most });
  }

  read(id: string): Promise<Client> {
    return this.api.get(`/v1/clients/${segment(id)}`);
  }

  make(client: Pick<Client, 'name' | 'defaultProfile'>): Promise<Client> {
    return this.api.post('/v1/clients', client);
  }

  change(id: string, change: ClientChange): Promise<Client> {
    return this.api.patch(`/v1/clients/${segment(id)}`, change);
  }

  keys(id: string): Promise<Page<Key>> {
    return this.api.get(`/v1/clients/${segment(id)}/keys`, { pageSize: most });
  }

  issue(id: string, request: KeyRequest): Promise<IssuedKey> {
    return this.api.post(`/v1/clients/${segment(id)}/keys`, request);
  }

  revoke(selector: string): Promise<Key> {
    return this.api.post(`/v1/keys/${segment(selector)}/revoke`);
  }
}
