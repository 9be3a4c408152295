import { readDoi } from '../citation/doi.js';
import type { CorrelationDefinition, PropertyEquationDefinition } from '../sheet/definition.js';
import type { Remark } from './remark.js';

/** Whether each source can be found again, and how sure the sheet is of it. */
export function inspectSources({
  sources,
  verification,
}: CorrelationDefinition | PropertyEquationDefinition): Remark[] {
  const remarks = sources.flatMap(({ csl }, i): Remark[] => {
    const field = `sources[${i}].csl`;
    const absent = [
      ...(csl.title || csl['container-title'] ? [] : ['a title']),
      ...(csl.author?.length || csl.publisher ? [] : ['an author']),
      ...(csl.issued ? [] : ['a year']),
    ];
    return [
      ...(absent.length > 0 ? [warning(field, `Source ${i + 1} lacks ${absent.join(' and ')}.`)] : []),
      ...(csl.DOI !== undefined && readDoi(csl.DOI) === undefined
        ? [
            {
              verdict: 'error' as const,
              topic: 'sources' as const,
              field: `${field}.DOI`,
              message: `"${csl.DOI}" is not a DOI.`,
            },
          ]
        : []),
    ];
  });
  if (verification.status === 'from-memory')
    remarks.push(warning('verification', 'Written down from memory: to be checked against the source.'));
  if (!sources.some(({ read }) => read === 'seen'))
    remarks.push(warning('sources', 'None of the sources is marked as read.'));
  if (remarks.length > 0) return remarks;
  return [
    {
      verdict: 'passed',
      topic: 'sources',
      field: 'sources',
      message: 'Every source has author, title, year and place.',
    },
  ];
}

function warning(field: string, message: string): Remark {
  return { verdict: 'warning', topic: 'sources', field, message };
}
