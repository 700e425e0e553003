import type { Description } from './description.ts';
import { emptySeal } from './seal.ts';

// eslint-disable-next-line no-control-regex -- XML 1.0 has no way to hold them
const unspeakable = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/gu;
const escape = (text: string): string =>
  text.replace(unspeakable, '').replace(/[<>&"]/gu, (sign) => `&#${String(sign.charCodeAt(0))};`);

/**
 * What the file says of itself as an XMP packet (ISO 16684-1), the same as in its information dictionary, with the digest
 * of its record and room for the seal.
 */
export function xmp({ title, subject, author, creator, language, digest, date }: Description): string {
  const alternative = (text: string): string =>
    `<rdf:Alt><rdf:li xml:lang="x-default">${escape(text)}</rdf:li></rdf:Alt>`;
  const properties = [
    '<dc:format>application/pdf</dc:format>',
    `<dc:title>${alternative(title)}</dc:title>`,
    `<dc:description>${alternative(subject)}</dc:description>`,
    author === '' ? '' : `<dc:creator><rdf:Seq><rdf:li>${escape(author)}</rdf:li></rdf:Seq></dc:creator>`,
    `<dc:language><rdf:Bag><rdf:li>${language}</rdf:li></rdf:Bag></dc:language>`,
    `<xmp:CreatorTool>${escape(creator)}</xmp:CreatorTool>`,
    date === null ? '' : `<xmp:CreateDate>${iso(date)}</xmp:CreateDate><xmp:ModifyDate>${iso(date)}</xmp:ModifyDate>`,
    `<pdf:Producer>${escape(creator)}</pdf:Producer>`,
    `<ferrule:digest>${digest}</ferrule:digest>`,
    emptySeal,
  ];
  return [
    '<?xpacket begin="\ufeff" id="W5M0MpCehiHzreSzNTczkc9d"?>',
    '<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">',
    '<rdf:Description rdf:about="" xmlns:dc="http://purl.org/dc/elements/1.1/" xmlns:xmp="http://ns.adobe.com/xap/1.0/" xmlns:pdf="http://ns.adobe.com/pdf/1.3/" xmlns:ferrule="urn:ferrule:report">',
    ...properties.filter((property) => property !== ''),
    '</rdf:Description></rdf:RDF></x:xmpmeta>',
    '<?xpacket end="r"?>',
  ].join('\n');
}

const iso = (date: Date): string => date.toISOString().replace(/\.\d+Z$/u, 'Z');
