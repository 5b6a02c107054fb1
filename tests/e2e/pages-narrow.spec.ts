import { describeEveryPage } from '../support/every-page';

describeEveryPage(390, 'dark');
