import { Button } from 'antd';
import type { ApiProblem } from '../api/api-problem';
import './notice.css';

interface ProblemNoticeProps {
  problem: ApiProblem;
  onRetry?: () => void;
}

/** An answer that is not the one asked for, in the server's own words, with what can be done. */
export function ProblemNotice({ problem, onRetry }: ProblemNoticeProps) {
  return (
    <div className="notice notice-problem" role="alert">
      <p className="notice-title">{problem.title}</p>
      {problem.detail && problem.detail !== problem.title ? <p>{problem.detail}</p> : null}
      {onRetry ? <Button onClick={onRetry}>Try again</Button> : null}
    </div>
  );
}
