import { describeEveryPage } from '../support/every-page';

describeEveryPage(1440, 'light');
