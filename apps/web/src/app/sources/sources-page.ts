import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { ActivatedRoute } from '@angular/router';
import { listSources, SOURCE_GROUPS, SOURCE_STANDINGS, type SourceStanding } from '@chargewright/engine/sources';
import { procedureWords, safetyWords, sourcesWords } from '@chargewright/wording';
import { UnitPreference } from '../quantities/unit-preference';
import { SourceItem } from './source-item';
import { findRows, sourceRow } from './source-rows';

const SOURCES = listSources();

/** On what everything stands: the list that the engine makes of its own data. */
@Component({
  selector: 'app-sources-page',
  imports: [SourceItem],
  templateUrl: './sources-page.html',
  styleUrl: './sources-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SourcesPage {
  private readonly units = inject(UnitPreference);

  protected readonly words = sourcesWords;
  protected readonly safety = safetyWords.standing;
  protected readonly standings = SOURCE_STANDINGS;
  protected readonly procedures = SOURCES.procedures.map(({ id, version, standings }) => ({
    id,
    ...procedureWords[id],
    version: sourcesWords.procedures.version(version),
    counts: standings
      .map(({ standing, count }) => sourcesWords.procedures.count(count, sourcesWords.standings[standing]))
      .join(' · '),
  }));

  /** A link may ask for a word. */
  protected readonly search = signal(inject(ActivatedRoute).snapshot.queryParamMap.get('search') ?? '');
  protected readonly standing = signal<SourceStanding | 'all'>('all');

  private readonly rows = computed(() => SOURCES.entries.map((entry) => sourceRow(entry, this.units.system())));
  private readonly found = computed(() => findRows(this.rows(), { search: this.search(), standing: this.standing() }));
  protected readonly narrowed = computed(() => this.search().trim() !== '' || this.standing() !== 'all');
  protected readonly count = computed(() => sourcesWords.found(this.found().length, this.rows().length));
  protected readonly groups = computed(() =>
    SOURCE_GROUPS.map((id) => ({
      id,
      name: sourcesWords.groups[id],
      rows: this.found().filter(({ group }) => group === id),
    })).filter(({ rows }) => rows.length > 0),
  );

  protected choose(text: string): void {
    this.standing.set(SOURCE_STANDINGS.find((each) => each === text) ?? 'all');
  }

  protected clear(): void {
    this.search.set('');
    this.standing.set('all');
  }
}
