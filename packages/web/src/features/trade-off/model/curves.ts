import {
  type AppraisalRequest,
  appraise,
  CalcError,
  curve,
  type Feasible,
  type LimitKey,
  type Limits,
  limitKeys,
} from '@steelyard/calc';
import type { Weighed } from '../../weigh/model/weighing';
import type { Over, SizePoint, Up } from './axes';

const mostPoints = 121;

/** What is asked of every curve of a picture. */
export interface Asked {
  over: Over;
  up: Up;
  /** The power that options are judged by. */
  power: number;
  limits: Limits;
}

/** An option over its size. */
export interface OptionCurve {
  from: number;
  to: number;
  points: readonly SizePoint[];
  /** The largest size within the limits, and the first limit that the next one breaks; null where none is. */
  end: { size: number; limit: LimitKey } | null;
  /** The most power that any cluster size gives, where that is less than asked for. */
  limitingPower: number | undefined;
}

/** Curves of a picture as far as they are known, by option. */
export type KnownCurves = Map<string, { key: string; curve: OptionCurve; now: SizePoint | undefined }>;

/** An option's curve, computed when what it comes from has changed; undefined where it has none. */
export function curveOf(option: Weighed, asked: Asked, known: KnownCurves): OptionCurve | undefined {
  const units = option.appraisal?.feasible ? option.appraisal.units : undefined;
  if (asked.over === 'clusterSize' && (units === undefined || !('clusterSize' in option.request.design))) {
    return undefined;
  }
  const key = JSON.stringify([comesFrom(option.request, asked.over, units), asked]);
  const now = sizeNow(option, asked.over);
  const before = known.get(option.id);
  const same = before?.key === key ? before.curve : undefined;
  if (same && (now === undefined || (now >= same.from && now <= same.to))) return same;
  try {
    const found = compute(option, asked, now);
    known.set(option.id, { key, curve: found, now: undefined });
    return found;
  } catch (error) {
    if (error instanceof CalcError) return undefined;
    throw error;
  }
}

/** The size an option has now, whether or not its curve has a point there; its curve must be known. */
export function pointNow(option: Weighed, asked: Asked, known: KnownCurves): SizePoint | undefined {
  const [size, entry] = [sizeNow(option, asked.over), known.get(option.id)];
  if (size === undefined || !entry) return undefined;
  if (entry.now?.size !== size) {
    const request = requestFor(option, asked);
    entry.now = curvePoints(request, asked, { from: size, to: size, points: 2 })[0];
  }
  return entry.now;
}

function sizeNow({ appraisal }: Weighed, over: Over): number | undefined {
  if (!appraisal?.feasible) return undefined;
  return over === 'units' ? appraisal.units : appraisal.clusterSize;
}

/** What shapes the curve: not the aim, nor the size it runs over. */
function comesFrom({ aim: _, ...request }: AppraisalRequest, over: Over, units: number | undefined): unknown {
  if (over === 'units') return request;
  return { ...request, design: { ...request.design, clusterSize: undefined }, units };
}

function compute(option: Weighed, asked: Asked, now: number | undefined): OptionCurve {
  const request = requestFor(option, asked);
  const { from, to } = rangeOf(option, asked, now);
  const points = curvePoints(request, asked, { from, to, points: Math.min(mostPoints, to - from + 1) });
  return {
    from: points[0]?.size ?? from,
    to: points.at(-1)?.size ?? to,
    points,
    end: endOf(request, asked, { from: points[0]?.size ?? from, to }),
    limitingPower: asked.over === 'clusterSize' ? limitingPowerOf(option, asked) : undefined,
  };
}

/** The request with an aim that gives a curve what it is asked for, and no more. */
function requestFor({ request, appraisal }: Weighed, { over, up, power }: Asked): AppraisalRequest {
  const units = appraisal?.feasible ? appraisal.units : 1000;
  const aim =
    up !== 'detectable'
      ? { find: 'power' as const, units }
      : over === 'units'
        ? { find: 'size' as const, power }
        : { find: 'effect' as const, units, power };
  return { ...request, aim };
}

/** From a quarter of the size that the power asks for to well past it, and always past the size it has. */
function rangeOf(option: Weighed, { over, power, limits }: Asked, now: number | undefined) {
  if (over === 'clusterSize') {
    const size = now ?? 20;
    const most = Math.max(2.5 * size, 1.15 * (limits.participantsPerCluster ?? 0));
    return { from: Math.max(1, Math.floor(size / 5)), to: Math.ceil(Math.max(12, most)) };
  }
  const sized = appraise({ ...option.request, aim: { find: 'size', power } });
  const reached = sized.feasible ? sized.units : (now ?? 100);
  const from = Math.min(reached / 4, now === undefined ? reached : 0.8 * now);
  const to = Math.max(1.75 * reached, now === undefined ? 0 : 1.25 * now, 6);
  return { from: Math.max(1, Math.floor(from)), to: Math.ceil(to) };
}

function curvePoints(
  request: AppraisalRequest,
  { over }: Asked,
  range: { from: number; to: number; points: number },
): SizePoint[] {
  return curve(request, { ...range, over, points: Math.max(2, range.points) }).map((point) => {
    const clusterSize = over === 'clusterSize' ? point.size : clusterSizeIn(request);
    return { ...point, ...(clusterSize === undefined ? {} : { clusterSize }) };
  });
}

const clusterSizeIn = ({ design }: AppraisalRequest): number | undefined =>
  'clusterSize' in design ? design.clusterSize : undefined;

function appraisedAt(request: AppraisalRequest, over: Over, size: number): Feasible {
  const units = over === 'units' ? size : 'units' in request.aim ? request.aim.units : size;
  const design = over === 'units' ? request.design : { ...request.design, clusterSize: size };
  const answer = appraise({ ...request, design, aim: { find: 'power', units } } as AppraisalRequest);
  if (!answer.feasible) throw new CalcError('unsupported', 'aim', answer.infeasible.message);
  return answer;
}

/** Sizes only take more of everything, so the first that breaks a limit is found by halving. */
function endOf(
  request: AppraisalRequest,
  { over, limits }: Asked,
  { from, to }: { from: number; to: number },
): OptionCurve['end'] {
  const brokenAt = (size: number) => firstBroken(limits, request, appraisedAt(request, over, size));
  const last = brokenAt(to);
  if (last === undefined) return null;
  const first = brokenAt(from);
  if (first !== undefined) return { size: from - 1, limit: first };
  let [within, beyond, limit] = [from, to, last];
  while (beyond - within > 1) {
    const middle = Math.floor((within + beyond) / 2);
    const broken = brokenAt(middle);
    if (broken === undefined) within = middle;
    else [beyond, limit] = [middle, broken];
  }
  return { size: within, limit };
}

function firstBroken(
  limits: Limits,
  { attrition }: AppraisalRequest,
  answer: Feasible,
): LimitKey | undefined {
  const { clusterSize } = answer;
  const taken: Record<LimitKey, number | undefined> = {
    clusters: answer.recruitedClusters,
    participantsPerCluster:
      clusterSize && Math.ceil(clusterSize / (1 - (attrition?.participants ?? 0)) - 1e-9),
    money: answer.costs?.total,
    months: answer.timeline?.months,
  };
  return limitKeys.find((key) => {
    const [allowed, used] = [limits[key], taken[key]];
    return allowed !== undefined && used !== undefined && used - allowed > 1e-9 * Math.max(1, allowed);
  });
}

function limitingPowerOf({ request, appraisal }: Weighed, { power }: Asked): number | undefined {
  if (!appraisal?.feasible) return undefined;
  const aim = { find: 'cluster-size' as const, units: appraisal.units, power };
  const answer = appraise({ ...request, aim });
  return answer.feasible ? undefined : answer.infeasible.limitingPower;
}
