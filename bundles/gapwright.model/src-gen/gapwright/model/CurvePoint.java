/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Curve Point</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * One point of a table.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.CurvePoint#getFieldStrength <em>Field Strength</em>}</li>
 *   <li>{@link gapwright.model.CurvePoint#getFluxDensity <em>Flux Density</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getCurvePoint()
 * @model
 * @generated
 */
public interface CurvePoint extends EObject {
	/**
	 * Returns the value of the '<em><b>Field Strength</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Field Strength</em>' attribute.
	 * @see #setFieldStrength(Quantity)
	 * @see gapwright.model.GapwrightPackage#getCurvePoint_FieldStrength()
	 * @model dataType="gapwright.model.FieldStrength" required="true"
	 * @generated
	 */
	Quantity getFieldStrength();

	/**
	 * Sets the value of the '{@link gapwright.model.CurvePoint#getFieldStrength <em>Field Strength</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Field Strength</em>' attribute.
	 * @see #getFieldStrength()
	 * @generated
	 */
	void setFieldStrength(Quantity value);

	/**
	 * Returns the value of the '<em><b>Flux Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Flux Density</em>' attribute.
	 * @see #setFluxDensity(Quantity)
	 * @see gapwright.model.GapwrightPackage#getCurvePoint_FluxDensity()
	 * @model dataType="gapwright.model.FluxDensity" required="true"
	 * @generated
	 */
	Quantity getFluxDensity();

	/**
	 * Sets the value of the '{@link gapwright.model.CurvePoint#getFluxDensity <em>Flux Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Flux Density</em>' attribute.
	 * @see #getFluxDensity()
	 * @generated
	 */
	void setFluxDensity(Quantity value);

} // CurvePoint
