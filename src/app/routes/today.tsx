import { AskedBoard } from '#src/features/sharing/components/asked-board.js';
import { SignsBoard } from '#src/features/signs/components/signs-board.js';
import { TodayPage } from '#src/features/today/components/today-page.js';
import { NoticesToday } from '#src/features/weather/components/notices-today.js';
import { WeatherBoard } from '#src/features/weather/components/weather-board.js';
import { SheetsToReplaceBoard } from '#src/features/withdrawals/components/sheets-to-replace-board.js';

/** Today, with the sheets that must come down, what the weather service says, and what waits for a word. */
export function Component() {
  return (
    <TodayPage
      urgent={
        <>
          <SheetsToReplaceBoard />
          <NoticesToday />
        </>
      }
      asked={<AskedBoard />}
      signs={<SignsBoard />}
      weather={<WeatherBoard />}
    />
  );
}
