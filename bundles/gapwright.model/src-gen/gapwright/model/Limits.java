/**
 */
package gapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Limits</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Where a leg counts as near saturation.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Limits#getNearFraction <em>Near Fraction</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getLimits()
 * @model
 * @generated
 */
public interface Limits extends EObject {
	/**
	 * Returns the value of the '<em><b>Near Fraction</b></em>' attribute.
	 * The default value is <code>"0.8"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Of saturation, above 0 to 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Near Fraction</em>' attribute.
	 * @see #setNearFraction(double)
	 * @see gapwright.model.GapwrightPackage#getLimits_NearFraction()
	 * @model default="0.8"
	 * @generated
	 */
	double getNearFraction();

	/**
	 * Sets the value of the '{@link gapwright.model.Limits#getNearFraction <em>Near Fraction</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Near Fraction</em>' attribute.
	 * @see #getNearFraction()
	 * @generated
	 */
	void setNearFraction(double value);

} // Limits
