import { Button } from './button.js';

/** Says that something typed earlier was found on this device, with the way to begin anew from what is saved. */
export function KeptNotice({
  words,
  startOverWords,
  onStartOver,
}: {
  words: string;
  startOverWords: string;
  onStartOver: () => void;
}) {
  return (
    <div className="notice-line" role="status">
      <span>{words}</span>
      <Button look="quiet" onClick={onStartOver}>
        {startOverWords}
      </Button>
    </div>
  );
}
