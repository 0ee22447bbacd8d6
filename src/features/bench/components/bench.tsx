import { packageReach_Hz } from '@shared/engine/package-reach';
import { newPartDistance_m, railDocument } from '@shared/rail/document';
import { targetMask } from '@shared/rail/target-mask';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { RailWithParts, Verdict } from '@shared/schemas/rail.schema';
import { useQuery } from '@tanstack/react-query';
import { type ReactNode, useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { Section } from '@/components/ui/page';
import { messageOf } from '@/lib/problem';
import { candidatesQuery } from '../api/part-choice';
import { useAnalysis } from '../hooks/use-analysis';
import { useBench } from '../hooks/use-bench';
import { useBenchKeys } from '../hooks/use-bench-keys';
import { useChecks } from '../hooks/use-checks';
import { mixIn, proofText, useMixSearch } from '../hooks/use-mix-search';
import { type DraftLine, isSameLine, keyed, savedBank } from '../lib/bank-history';
import { benchCautions } from '../lib/cautions';
import { failingChecks } from '../lib/failing-checks';
import { bankOfMix } from '../lib/mix';
import { askedOf, NO_QUESTION } from '../lib/search-question';
import { cornerOfView, NEXT_VIEW, type ValuesView, VIEW_NAMES } from '../lib/values-view';
import { BenchFacts } from './bench-facts';
import { BenchFooter } from './bench-footer';
import { BenchSections, YieldOfBank } from './bench-sections';
import { CautionsPanel } from './cautions-panel';
import { LoadStepPanel, StartUpPanel, WorstCasesPanel } from './check-panels';
import { PartPicker } from './part-picker';
import { ConflictDialog, SaveStatus } from './save-status';
import { chartSpan, memberName, Score } from './score';
import { SearchPanel } from './search-panel';
import { SidePanel } from './side-panel';

interface BenchProps {
  server: RailWithParts;
  /** The board's stack-up and mount recipes. */
  setup: BoardSetup;
  personId: string;
  canEdit: boolean;
  /** Address of the specification form, for who may edit. */
  editTo: string | null;
  onSaved: (answer: RailWithParts) => void;
  /** The bank as it stands on the bench has a new result in service, saved or not. */
  onResult: (result: Verdict) => void;
  /** Puts the save state where the page wants it (the header). */
  renderStatus: (status: ReactNode) => ReactNode;
}

/** The working screen of one rail. Mounted anew for each rail (by key). */
export function Bench(props: BenchProps) {
  const { server, setup, personId, canEdit, editTo, onSaved, onResult, renderStatus } = props;
  const { spec } = server.rail;
  const bench = useBench({ server, personId, onSaved });
  const [picking, setPicking] = useState(false);
  const [showLines, setShowLines] = useState(true);
  const [showEnvelope, setShowEnvelope] = useState(false);
  const [view, setView] = useState<ValuesView>('service');
  const [previewing, setPreviewing] = useState(false);
  const [searchWanted, setSearchWanted] = useState(false);
  const [adopted, setAdopted] = useState<{ bank: string; text: string; proven: boolean } | null>(null);
  /** A line that should have the focus once it is there, so that the keys go on working. */
  const [focusKey, setFocusKey] = useState<string | null>(null);
  const [zoom, setZoom] = useState<[number, number] | null>(null);
  const whole = useMemo(() => chartSpan(spec.band_Hz), [spec.band_Hz]);
  const candidates = useQuery(candidatesQuery(spec.voltage_V));
  const search = useMixSearch();

  const mix = mixIn(search.state);
  const known = useMemo(
    () => new Map([...(candidates.data ?? []).map((part) => [part.id, part] as const), ...bench.parts]),
    [candidates.data, bench.parts],
  );
  const newPartDistance = newPartDistance_m(bench.search, bench.lines);
  const mixLines = useMemo(
    () => (mix ? bankOfMix(bench.lines, mix, known, newPartDistance) : null),
    [mix, bench.lines, known, newPartDistance],
  );
  const isPreview = previewing && mixLines !== null;
  const shownLines = isPreview ? mixLines : bench.lines;
  const document = useMemo(
    () => railDocument(spec, shownLines, known, setup),
    [spec, shownLines, known, setup],
  );
  const checks = useChecks(document, whole);
  const verdicts = checks.verdicts.value;
  const corner = cornerOfView(view, verdicts?.corners[0]?.corner ?? null);
  const present = useAnalysis('bench', spec, bench.lines, known, setup, corner, whole);
  const found = useAnalysis('preview', spec, mixLines, known, setup, corner, whole);
  const tell = useRef(onResult);
  tell.current = onResult;
  const isOwn = checks.verdicts.current && !isPreview;
  useEffect(() => {
    if (verdicts && isOwn) tell.current(verdicts.service);
  }, [verdicts, isOwn]);
  const reach_Hz = useMemo(
    () => (spec.package ? packageReach_Hz(spec.package, spec.band_Hz, targetMask(spec)) : null),
    [spec],
  );
  const numberName = useCallback((number: string) => memberName(number, known), [known]);
  const shown = isPreview ? found : present;
  const other = isPreview
    ? present.analysis && { name: 'present bank', analysis: present.analysis }
    : found.analysis && { name: 'best mix', analysis: found.analysis };
  const before = useMemo(
    () => (isPreview ? new Map(bench.lines.map((line) => [line.partId, line.count])) : null),
    [isPreview, bench.lines],
  );

  const lockedCount = bench.lines.reduce((sum, line) => (line.locked ? sum + line.count : sum), 0);
  const question = useMemo(
    () =>
      canEdit && candidates.data
        ? askedOf(candidates.data, spec, bench.lines, known, setup, bench.search, view !== 'catalogue')
        : NO_QUESTION,
    [candidates.data, canEdit, bench.search, bench.lines, known, spec, setup, view],
  );
  const asked = useMemo(() => JSON.stringify(question.asked), [question]);
  const outdated = search.state.kind !== 'idle' && search.question !== null && search.question !== asked;
  const startSearch = () => {
    if (!question.asked) {
      // Asked before the candidates have come: begins as soon as they have.
      setSearchWanted(candidates.isPending);
      return;
    }
    setSearchWanted(false);
    setPreviewing(false);
    setAdopted(null);
    void search.start(question.asked);
  };

  const begin = useRef(startSearch);
  begin.current = startSearch;
  useEffect(() => {
    if (searchWanted && question.asked) begin.current();
  }, [searchWanted, question]);

  const addPart = (part: Part) => {
    bench.learn([part]);
    const there = bench.lines.find((line) => line.partId === part.id);
    if (there) {
      bench.edit({ type: 'count', key: there.key, count: there.count + 1, at: Date.now() });
      setFocusKey(there.key);
    } else {
      const [line] = keyed([
        {
          partId: part.id,
          count: 1,
          mount_H: null,
          recipeId: null,
          distance_m: null,
          side: 'top',
          locked: false,
        },
      ]);
      bench.edit({ type: 'add', line });
      setFocusKey(line.key);
    }
    setPicking(false);
  };
  const change = (key: string, patch: Partial<DraftLine>): string | null => {
    const line = bench.lines.find((one) => one.key === key);
    if (!line) return null;
    const next = { ...line, ...patch };
    if (bench.lines.some((one) => one.key !== key && isSameLine(one, next)))
      return 'another line has this part mounted alike: raise its count instead';
    bench.edit({ type: 'change', key, patch });
    return null;
  };
  const adopt = () => {
    if (!mixLines) return;
    bench.learn(mixLines.flatMap((line) => known.get(line.partId) ?? []));
    bench.edit({ type: 'replace', lines: mixLines });
    setAdopted({
      bank: JSON.stringify(savedBank(mixLines)),
      ...proofText(search.state, bench.search.minimise, lockedCount),
    });
    setFocusKey(mixLines[0]?.key ?? null);
    setPreviewing(false);
    search.reset();
  };
  useBenchKeys({
    undo: () => canEdit && bench.edit({ type: 'undo' }),
    redo: () => canEdit && bench.edit({ type: 'redo' }),
    search: startSearch,
    add: () => canEdit && setPicking(true),
    lines: () => setShowLines((on) => !on),
    envelope: () => setShowEnvelope((on) => !on),
    values: () => setView((now) => NEXT_VIEW[now]),
  });
  const cautions = benchCautions(spec, shownLines, known, setup, shown.analysis);
  return (
    <div className="grid min-h-full min-w-0 grid-cols-[minmax(0,1fr)] xl:grid-cols-[minmax(0,1fr)_18.5rem] xl:grid-rows-[auto_1fr]">
      {renderStatus(<SaveStatus save={bench.save} />)}
      <ConflictDialog
        save={bench.save}
        personId={personId}
        lines={bench.lines}
        parts={known}
        onSettle={bench.settle}
      />
      <div className="min-w-0 py-5 pr-5 pl-6">
        {isPreview && (
          <p className="mb-3 border-l-2 border-deep pl-3">
            <strong>Preview of the mix found.</strong> The bank is unchanged; its curve is dashed.
          </p>
        )}
        <Score
          spec={spec}
          lines={shownLines}
          parts={known}
          analysis={shown.analysis}
          other={other}
          before={before}
          setup={setup}
          envelope={showEnvelope ? (verdicts?.envelope ?? null) : null}
          reach_Hz={reach_Hz}
          showCatalogue={view !== 'catalogue'}
          span_Hz={zoom ?? whole}
          onSpan={setZoom}
          focusKey={isPreview ? null : focusKey}
          onFocused={() => setFocusKey(null)}
          showLines={showLines}
          readOnly={!canEdit || isPreview}
          facts={
            <BenchFacts
              spec={spec}
              editTo={editTo}
              view={view}
              onView={setView}
              showLines={showLines}
              onShowLines={setShowLines}
              showEnvelope={showEnvelope}
              onShowEnvelope={setShowEnvelope}
              corners={verdicts?.corners.length ?? null}
            />
          }
          onCount={(key, count) => bench.edit({ type: 'count', key, count, at: Date.now() })}
          onChange={change}
          onRemove={(key) => bench.edit({ type: 'remove', key })}
          footer={
            <BenchFooter
              canEdit={canEdit}
              canUndo={bench.canUndo}
              canRedo={bench.canRedo}
              onAdd={() => setPicking(true)}
              onUndo={() => bench.edit({ type: 'undo' })}
              onRedo={() => bench.edit({ type: 'redo' })}
            />
          }
        />
        {bench.lines.length === 0 && !isPreview && (
          <p className="max-w-prose pb-4 text-stone">
            The bank is empty: what you see is source and planes alone.
            {canEdit && ' Add a part, or let the mix search find the smallest bank.'}
          </p>
        )}
      </div>
      <aside aria-label="results" className="border-t px-6 py-5 xl:row-span-2 xl:border-t-0 xl:border-l">
        <SidePanel
          analysis={shown.analysis}
          values={view === 'worst' && verdicts ? `worst case: ${verdicts.corners[0].name}` : VIEW_NAMES[view]}
          failing={failingChecks(verdicts, checks.inTime.value)}
          error={shown.error}
          nameOf={(id) => memberName(id, known)}
          checks={
            <>
              <WorstCasesPanel checks={checks} nameOf={numberName} />
              <LoadStepPanel
                checks={checks}
                frequencyHolds={verdicts?.service.holds ?? null}
                band_Hz={spec.band_Hz}
              />
            </>
          }
        >
          <StartUpPanel checks={checks} voltage_V={spec.voltage_V} />
          {canEdit && (
            <Section title="mix search">
              <SearchPanel
                settings={bench.search}
                newPartDistance_m={newPartDistance}
                candidates={candidates.data}
                candidatesError={candidates.isError ? messageOf(candidates.error) : (question.fault ?? null)}
                state={search.state}
                locked={lockedCount}
                previewing={isPreview}
                outdated={outdated}
                values={view === 'catalogue' ? 'at catalogue values' : 'in service'}
                adopted={adopted?.bank === JSON.stringify(savedBank(bench.lines)) ? adopted : null}
                readOnly={!canEdit}
                onSettings={bench.setSearch}
                onSearch={startSearch}
                onStop={search.stop}
                onPreview={setPreviewing}
                onAdopt={adopt}
                onDismiss={search.reset}
              />
            </Section>
          )}
          <CautionsPanel cautions={cautions} />
        </SidePanel>
      </aside>
      <div className="flex min-w-0 flex-col gap-10 py-5 pr-5 pl-6 pt-8">
        <BenchSections spec={spec} verdicts={verdicts} inTime={checks.inTime.value} nameOf={numberName} />
        {document.bank.length > 0 && <YieldOfBank document={document} nameOf={numberName} />}
      </div>
      {picking && (
        <PartPicker open voltage_V={spec.voltage_V} onPick={addPart} onClose={() => setPicking(false)} />
      )}
    </div>
  );
}
