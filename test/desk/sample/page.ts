import '../../../components/desk/page/desk-page.js';
import { sampleModel } from './model.js';
import { sampleScan } from './scan.js';

/** The desk's page on invented results, to look at while nothing computes. */
const page = document.createElement('desk-page');
page.model = sampleModel;
page.scan = sampleScan;
document.body.append(page);
