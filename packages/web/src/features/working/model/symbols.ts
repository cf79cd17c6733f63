import type { AppraisalRequest } from '@steelyard/calc';

/** A symbol of the working as TeX, and what it stands for. */
export interface SymbolMeaning {
  tex: string;
  says: string;
}

const symbol = (tex: string, says: string): SymbolMeaning => ({ tex, says });

/** What the letters of a working stand for, as far as its lines do not say it themselves. */
export function symbolsOf(request: AppraisalRequest): SymbolMeaning[] {
  const { outcome, test } = request;
  return [
    symbol('\\delta', 'effect on the scale of the analysis, active against control'),
    ...(outcome.kind === 'continuous' ? [symbol('\\sigma', 'standard deviation of one participant')] : []),
    ...designSymbols(request),
    ...(outcome.kind === 'time-to-event'
      ? [
          symbol('P_0,\\;P_1,\\;D', 'chance of an event by arm, and events in all'),
          symbol('r', 'active participants for each under control'),
        ]
      : []),
    ...(test.hypothesis === 'superiority' ? [] : [symbol('\\Delta', 'margin')]),
    symbol('\\mathrm{SE},\\;\\nu,\\;c', 'standard error of the effect, degrees of freedom, critical value'),
    symbol('\\alpha,\\;1-\\beta', 'type I error and power'),
  ];
}

function designSymbols({ outcome, design }: AppraisalRequest): SymbolMeaning[] {
  if ('cac' in design) return periodSymbols;
  if ('icc' in design || 'iccCluster' in design || 'rateCv' in design) {
    return [
      symbol('k', 'clusters or groups, by arm'),
      symbol('m', 'participants of a cluster or group'),
      ...(outcome.kind === 'count' ? [] : [symbol('\\rho', 'ICC: correlation of two members of one')]),
    ];
  }
  return [
    symbol('n_g,\\;N', 'participants analysed in an arm, and in all'),
    ...('sequences' in design ? [symbol('\\rho', 'within-person correlation of two periods')] : []),
    ...(outcome.kind === 'continuous' && outcome.repeated
      ? [
          symbol('p,\\;m', 'baseline and follow-up measurements of each participant'),
          symbol('\\rho', 'correlation of two measurements of one participant'),
        ]
      : []),
  ];
}

const periodSymbols = [
  symbol('k_s', 'clusters of sequence s'),
  symbol('m', 'participants of a cluster measured in a period'),
  symbol('\\rho', 'ICC: correlation of two members of a cluster in one period'),
  symbol('r', 'cluster autocorrelation of the two periods'),
  symbol('a', 'individual autocorrelation; 0 where each period has participants of its own'),
  symbol(
    'x_{st},\\;\\tilde x_{st}',
    'treatment of sequence s in period t, and less its mean over the clusters',
  ),
  symbol('\\mathbf V_s', 'covariance of a cluster’s means over the periods in which it is measured'),
  symbol('\\mathbf A,\\;\\mathbf b', 'information on the periods, and what periods and effect share'),
];
