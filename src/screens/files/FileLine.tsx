import type { FilePreview, FileProblem } from '../../tasks/index.ts';
import { Hold, Ring, Tick } from '../../ui/Sign.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

/** One file: a shape and a word for whether it can be taken, then what it would bring or the one thing that is wrong. */
export function FileLine({ file }: { readonly file: FilePreview }) {
  const words = useWords();
  const asks = file.askRoles.length > 0;
  const fine = file.problems.length === 0;
  const told = ({ problem, line }: FileProblem): string => {
    const sentence = say(words.problems, problem);
    return line === null ? sentence : words.files.line({ line, sentence });
  };
  const brings = [
    words.files.sessions({ counts: file.sessions }),
    words.files.classes({ counts: file.classes }),
  ].filter((text) => text !== '');
  const [first] = file.problems;
  return (
    <li className="file-line">
      {asks ? <Ring /> : fine ? <Tick /> : <Hold />}
      <div className="grow">
        <p>
          <strong>{file.name}</strong>{' '}
          <span className="second">
            {[
              words.files.form({ form: file.form }),
              file.studies.length > 0
                ? words.files.ofStudies({ names: file.studies.map(({ name }) => name) })
                : '',
              asks ? words.files.waits : fine ? words.files.can : words.files.cannot,
            ]
              .filter((text) => text !== '')
              .join(', ')}
          </span>
        </p>
        {fine && <p>{brings.length === 0 ? words.files.nothingNew : `${brings.join('; ')}.`}</p>}
        {!asks && first !== undefined && <p>{told(first)}</p>}
        {!asks && file.problems.length > 1 && (
          <p className="second">{words.files.others({ count: file.problems.length - 1 })}</p>
        )}
        {file.notices.map((notice) => (
          <p key={told(notice)} className="second small">
            {told(notice)}
          </p>
        ))}
      </div>
    </li>
  );
}
