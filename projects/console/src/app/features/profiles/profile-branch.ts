import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { AnswerTag } from '../../shared/answer-tag';
import { ScrollTable } from '../../shared/scroll-table';
import { type Branch, isUnconfirmed, knownBy, readIn } from './provenance';

interface DepartureLine {
  readonly id: string;
  readonly path: string;
}

/** A branch of a profile's tree as one table: value, clause, source, how it is known. */
@Component({
  selector: 'app-profile-branch',
  imports: [AnswerTag, ScrollTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <section class="part" [attr.aria-labelledby]="'branch-' + branch().name">
      <h2 [id]="'branch-' + branch().name">{{ branch().name }}</h2>
      <div appScroll [attr.aria-label]="'Table of ' + branch().name">
        <table role="table" class="sheet stack">
          <thead role="rowgroup">
            <tr role="row">
              <th role="columnheader" scope="col">Value</th>
              <th role="columnheader" scope="col" class="n">Is</th>
              <th role="columnheader" scope="col">Clause</th>
              <th role="columnheader" scope="col">Source</th>
              <th role="columnheader" scope="col">Known</th>
            </tr>
          </thead>
          <tbody role="rowgroup">
            @for (value of branch().values; track value.path) {
              <tr role="row">
                <th role="rowheader" scope="row" class="mono">{{ value.name }}</th>
                <td role="cell" data-label="Is" class="n">
                  <span>
                    @if (departed().get(value.path); as id) {
                      <span class="departed">{{ id }}</span>
                    }
                    {{ value.value }}{{ value.unit === '1' ? '' : ' ' + value.unit }}
                  </span>
                </td>
                <td role="cell" data-label="Clause" class="clause">{{ value.clause }}</td>
                <td role="cell" data-label="Source" class="source">{{ readIn(value) }}</td>
                <td role="cell" data-label="Known" class="known">
                  @if (isUnconfirmed(value)) {
                    <app-answer-tag standing="provisional" [words]="knownBy(value)" />
                  } @else {
                    <span>{{ knownBy(value) }}</span>
                  }
                  @if (value.note) {
                    <span class="remark">{{ value.note }}</span>
                  }
                </td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    </section>
  `,
  styles: `
    h2 {
      font-family: var(--mono);
      font-size: 14px;
    }
    @media screen and (min-width: 621px) {
      table {
        min-width: 860px;
      }
    }
    @media print, (min-width: 621px) {
      table {
        table-layout: fixed;
      }
      th:nth-child(1) {
        width: 17%;
      }
      th:nth-child(2) {
        width: 10%;
      }
      th:nth-child(3) {
        width: 22%;
      }
      th:nth-child(4) {
        width: 31%;
      }
    }
    td,
    tbody th {
      overflow-wrap: anywhere;
    }
    td.n {
      white-space: normal;
    }
    .departed {
      color: var(--timber);
      margin-right: 6px;
    }
    .clause {
      font-family: var(--mono);
      font-size: 12px;
    }
    .remark {
      display: block;
      font-size: 12px;
      color: var(--quiet);
    }
  `,
})
export class ProfileBranch {
  readonly branch = input.required<Branch>();
  readonly departures = input.required<readonly DepartureLine[]>();
  protected readonly departed = computed(
    () => new Map(this.departures().map(({ id, path }) => [path, id])),
  );
  protected readonly isUnconfirmed = isUnconfirmed;
  protected readonly knownBy = knownBy;
  protected readonly readIn = readIn;
}
