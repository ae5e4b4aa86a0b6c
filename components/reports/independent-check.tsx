import { Disclosure } from '../ui/disclosure'

/** How to check without trusting this page. */
export const IndependentCheck = () => (
  <section className="mt-8 border-t border-rule pt-4">
    <Disclosure summary="Check it without us">
      <p className="max-w-measure">
        The signatures are detached CAdES in a PDF (ETSI EN 319 142-1, level B-B) on P-256 with SHA-256. With
        the practice’s authority certificate imported, poppler’s{' '}
        <code className="num">pdfsig report.pdf</code> names both signers;{' '}
        <code className="num">sha256sum report.pdf</code> gives the hash to compare with the one above. A
        viewer may call a file valid to which something was added between the signatures; this page does not.
      </p>
    </Disclosure>
  </section>
)
