/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Initial Permeability</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Initial permeability at a temperature.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.InitialPermeability#getTemperature <em>Temperature</em>}</li>
 *   <li>{@link gapwright.model.InitialPermeability#getRelativePermeability <em>Relative Permeability</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getInitialPermeability()
 * @model
 * @generated
 */
public interface InitialPermeability extends EObject {
	/**
	 * Returns the value of the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Temperature</em>' attribute.
	 * @see #setTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getInitialPermeability_Temperature()
	 * @model dataType="gapwright.model.Temperature" required="true"
	 * @generated
	 */
	Quantity getTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.InitialPermeability#getTemperature <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Temperature</em>' attribute.
	 * @see #getTemperature()
	 * @generated
	 */
	void setTemperature(Quantity value);

	/**
	 * Returns the value of the '<em><b>Relative Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Above 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Relative Permeability</em>' attribute.
	 * @see #setRelativePermeability(double)
	 * @see gapwright.model.GapwrightPackage#getInitialPermeability_RelativePermeability()
	 * @model required="true"
	 * @generated
	 */
	double getRelativePermeability();

	/**
	 * Sets the value of the '{@link gapwright.model.InitialPermeability#getRelativePermeability <em>Relative Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Relative Permeability</em>' attribute.
	 * @see #getRelativePermeability()
	 * @generated
	 */
	void setRelativePermeability(double value);

} // InitialPermeability
