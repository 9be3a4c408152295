import { Link, useParams } from 'react-router-dom';
import { usePropertyEquation } from '../../features/property-equations/api/use-property-equations';
import { PropertyEquationArticle } from '../../features/property-equations/components/property-equation-article';
import { ChecksSection } from '../../features/sheet/components/checks-section';
import { SourceNotes } from '../../features/sheet/components/source-notes';
import '../../features/sheet/components/sheet-article.css';
import { paths } from '../../shared/paths';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

export function PropertyEquationRoute() {
  const { slug = '' } = useParams();
  const { equation, problem, retry } = usePropertyEquation(slug);
  if (equation)
    return (
      <PropertyEquationArticle
        equation={equation}
        sources={<SourceNotes sources={equation.definition.sources} />}
        checks={<ChecksSection sheet={equation} />}
      />
    );
  return (
    <SheetPage title={problem?.status === 404 ? 'No such property equation' : 'Property equation'}>
      {problem ? (
        <ProblemNotice problem={problem} {...(problem.status === 404 ? {} : { onRetry: retry })} />
      ) : (
        <Loading what="the equation" />
      )}
      <p>
        <Link to={paths.propertyEquations}>See all property equations</Link>
      </p>
    </SheetPage>
  );
}
