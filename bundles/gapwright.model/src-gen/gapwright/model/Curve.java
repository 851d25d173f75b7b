/**
 */
package gapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Curve</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Flux density against field strength, odd and rising.
 * <!-- end-model-doc -->
 *
 *
 * @see gapwright.model.GapwrightPackage#getCurve()
 * @model abstract="true"
 * @generated
 */
public interface Curve extends EObject {
} // Curve
